import type { ReactNode } from 'react';

/** The head of a log page: what it is, a line beneath, and what can be done at its right. */
export function PageHeading({
  title,
  children,
  actions,
}: {
  title: ReactNode;
  children?: ReactNode;
  actions?: ReactNode;
}) {
  return (
    <header className="mb-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-3">
      <div>
        <h1 className="text-3xl">{title}</h1>
        {children === undefined ? null : <p className="mt-1 text-ink-soft">{children}</p>}
      </div>
      {actions === undefined ? null : (
        <div className="screen-only flex flex-wrap gap-3">{actions}</div>
      )}
    </header>
  );
}
