'use client';

import { useEffect, useState } from 'react';
import { readPalette, type ChartPalette } from './chart-palette';

/** The palette in force; read again when day turns to night, by the switch, by the device or for the printer. */
export function usePalette(): ChartPalette {
  const [palette, setPalette] = useState(readPalette);
  useEffect(() => {
    const readAgain = () => setPalette(readPalette());
    const queries = ['(prefers-color-scheme: dark)', 'print'].map((query) => matchMedia(query));
    const observer = new MutationObserver(readAgain);
    observer.observe(document.documentElement, { attributeFilter: ['data-theme'] });
    queries.forEach((query) => query.addEventListener('change', readAgain));
    return () => {
      observer.disconnect();
      queries.forEach((query) => query.removeEventListener('change', readAgain));
    };
  }, []);
  return palette;
}
