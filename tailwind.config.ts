import type { Config } from 'tailwindcss';

const token = (name: string) => `var(--${name})`;

/** The works log's palette: values live in app/globals.css, once for day, once for night, once for paper. */
const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      chalk: { DEFAULT: token('chalk'), sheet: token('chalk-sheet'), shade: token('chalk-shade') },
      ink: { DEFAULT: token('ink'), soft: token('ink-soft') },
      rule: { DEFAULT: token('rule'), strong: token('rule-strong') },
      verdigris: {
        DEFAULT: token('verdigris'),
        deep: token('verdigris-deep'),
        wash: token('verdigris-wash'),
        on: token('verdigris-on'),
      },
      rust: { DEFAULT: token('rust'), wash: token('rust-wash') },
      ochre: { DEFAULT: token('ochre'), wash: token('ochre-wash') },
    },
    fontFamily: {
      text: ['var(--font-text)', 'sans-serif'],
      figure: ['var(--font-figure)', 'monospace'],
      head: ['var(--font-head)', 'serif'],
    },
    extend: {
      minHeight: { touch: '2.75rem' },
      minWidth: { touch: '2.75rem' },
      spacing: { touch: '2.75rem' },
      maxWidth: { page: '88rem', prose: '64ch' },
    },
  },
};

export default config;
