/** The look of every line that is written into. */
export const inputClass = (hasProblem: boolean): string =>
  `min-h-touch w-full border bg-chalk px-3 py-1.5 ${
    hasProblem ? 'border-2 border-rust' : 'border-rule-strong'
  }`;
