/** Day and night are the reader's choice; without one the device decides. */
export const THEMES = ['day', 'night'] as const;
export type Theme = (typeof THEMES)[number];
export const THEME_COOKIE = 'marlwick-theme';

export const isTheme = (value: string | undefined): value is Theme =>
  (THEMES as readonly (string | undefined)[]).includes(value);
