import type { ReactNode } from 'react';
import { Formula } from './formula';

/** A number with its unit set small after it. */
export function Figure({
  children,
  unit,
  className = '',
}: {
  children: ReactNode;
  unit?: string;
  className?: string;
}) {
  return (
    <span className={`whitespace-nowrap ${className}`}>
      <span className="figure">{children}</span>
      {unit === undefined || unit === '' || unit === 'pH' ? null : (
        <>
          {' '}
          <span className="unit">
            <Formula>{unit}</Formula>
          </span>
        </>
      )}
    </span>
  );
}
