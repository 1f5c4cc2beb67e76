import localFont from 'next/font/local';

// The files come from the font packages and are shipped with the app; no font service is asked.
export const headingFont = localFont({
  src: '../node_modules/@fontsource-variable/literata/files/literata-latin-wght-normal.woff2',
  weight: '200 900',
  variable: '--font-head',
  display: 'swap',
});

export const textFont = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--font-text',
  display: 'swap',
});

export const figureFont = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--font-figure',
  display: 'swap',
});
