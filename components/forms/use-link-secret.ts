'use client';

import { useSyncExternalStore } from 'react';

const onHashChange = (changed: () => void): (() => void) => {
  window.addEventListener('hashchange', changed);
  return () => window.removeEventListener('hashchange', changed);
};

/** The secret behind the # of a letter's link; null while the page is still being drawn. No server ever sees it. */
export const useLinkSecret = (): string | null =>
  useSyncExternalStore(
    onHashChange,
    () => window.location.hash.slice(1),
    () => null,
  );
