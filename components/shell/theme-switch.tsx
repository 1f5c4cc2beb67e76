'use client';

import { THEME_COOKIE, type Theme } from '@/lib/theme';
import { buttonClass } from '@/components/ui/button';

const ONE_YEAR_S = 31_536_000;

function shownTheme(): Theme {
  const chosen = document.documentElement.dataset.theme;
  if (chosen === 'day' || chosen === 'night') return chosen;
  return window.matchMedia('(prefers-color-scheme: dark)').matches ? 'night' : 'day';
}

/** Day or night page, remembered on this device. */
export function ThemeSwitch() {
  const turn = () => {
    const next: Theme = shownTheme() === 'night' ? 'day' : 'night';
    document.documentElement.dataset.theme = next;
    document.cookie = `${THEME_COOKIE}=${next}; path=/; max-age=${ONE_YEAR_S}; samesite=lax${location.protocol === 'https:' ? '; secure' : ''}`;
  };
  return (
    <button type="button" onClick={turn} className={buttonClass('quiet')}>
      Day / night
    </button>
  );
}
