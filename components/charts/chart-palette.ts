export interface ChartPalette {
  ink: string;
  soft: string;
  rule: string;
  strong: string;
  verdigris: string;
  wash: string;
  rust: string;
  sheet: string;
  figureFont: string;
  textFont: string;
}

/** The page's own colours and faces, read from its custom properties: canvas knows no CSS. */
export function readPalette(): ChartPalette {
  const style = getComputedStyle(document.documentElement);
  const token = (name: string) => style.getPropertyValue(`--${name}`).trim();
  return {
    ink: token('ink'),
    soft: token('ink-soft'),
    rule: token('rule'),
    strong: token('rule-strong'),
    verdigris: token('verdigris'),
    wash: token('verdigris-wash'),
    rust: token('rust'),
    sheet: token('chalk-sheet'),
    figureFont: token('font-figure'),
    textFont: token('font-text'),
  };
}
