import type { ButtonHTMLAttributes, ReactNode } from 'react';

const SHAPES = {
  main: 'bg-verdigris text-verdigris-on border-verdigris hover:bg-verdigris-deep hover:border-verdigris-deep',
  plain:
    'bg-transparent text-verdigris border-rule-strong hover:border-verdigris hover:bg-verdigris-wash',
  quiet:
    'bg-transparent text-ink-soft border-transparent hover:text-ink underline underline-offset-4',
} as const;

export const buttonClass = (shape: keyof typeof SHAPES = 'plain'): string =>
  `inline-flex min-h-touch items-center justify-center gap-2 border px-4 py-1.5 font-semibold no-underline transition-colors disabled:cursor-not-allowed disabled:opacity-60 ${SHAPES[shape]}`;

/** Square-cornered like a stamp; 44 px high for gloves. */
export function Button({
  shape = 'plain',
  children,
  className = '',
  ...rest
}: ButtonHTMLAttributes<HTMLButtonElement> & { shape?: keyof typeof SHAPES; children: ReactNode }) {
  return (
    <button type="button" {...rest} className={`${buttonClass(shape)} ${className}`}>
      {children}
    </button>
  );
}
