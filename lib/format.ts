/** Numbers and times as the screens write them: true minus sign, fixed decimals, plant-local time. */

const MINUS = '\u2212';

/** Fixed decimals with a true minus; never "−0.00". */
export function formatNumber(value: number, decimals: number): string {
  const fixed = value.toFixed(decimals);
  const magnitude = fixed.startsWith('-') ? fixed.slice(1) : fixed;
  const isZero = Number(magnitude) === 0;
  return fixed.startsWith('-') && !isZero ? `${MINUS}${magnitude}` : magnitude;
}

/** The same with its sign always shown: a change. */
export function formatChange(value: number, decimals: number): string {
  const text = formatNumber(value, decimals);
  if (Number(text.replace(MINUS, '-')) === 0) return text;
  return text.startsWith(MINUS) ? text : `+${text}`;
}

/** `+0.5` mg/L worth of sense from very large and very small amounts: three significant figures. */
export function formatSignificant(value: number, digits = 3): string {
  if (value === 0) return '0';
  const magnitude = Math.floor(Math.log10(Math.abs(value)));
  if (magnitude >= digits || magnitude < -4) {
    const [mantissa = '0', exponent = '0'] = value.toExponential(digits - 1).split('e');
    return `${mantissa.replace('-', MINUS)} × 10^${exponent.replace('+', '').replace('-', MINUS)}`;
  }
  return formatNumber(value, Math.max(0, digits - 1 - magnitude));
}

/** `Al2(SO4)3·14.3H2O` with real subscripts: the digits after an element or a bracket, not the coefficients. */
export const formatFormula = (ascii: string): string =>
  ascii.replace(/(?<=[A-Za-z)])\d+/g, (digits) =>
    [...digits].map((digit) => '₀₁₂₃₄₅₆₇₈₉'[Number(digit)] ?? digit).join(''),
  );

const dateTimeFormats = new Map<string, Intl.DateTimeFormat>();

function formatter(timeZone: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = `${timeZone} ${JSON.stringify(options)}`;
  const known = dateTimeFormats.get(key);
  if (known !== undefined) return known;
  const made = new Intl.DateTimeFormat('en-GB', { timeZone, hourCycle: 'h23', ...options });
  dateTimeFormats.set(key, made);
  return made;
}

export const formatDay = (at: Date, timeZone: string): string =>
  formatter(timeZone, { day: 'numeric', month: 'short', year: 'numeric' }).format(at);

export const formatWeekday = (at: Date, timeZone: string): string =>
  formatter(timeZone, { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' }).format(
    at,
  );

export const formatTime = (at: Date, timeZone: string): string =>
  formatter(timeZone, { hour: '2-digit', minute: '2-digit' }).format(at);

export const formatDayTime = (at: Date, timeZone: string): string =>
  `${formatDay(at, timeZone)}, ${formatTime(at, timeZone)}`;

/** How long ago, as a person says it: `20 min ago`, `6 h ago`, `3 d ago`. */
export function formatAge(at: Date, now: Date): string {
  const minutes = Math.max(0, Math.round((now.getTime() - at.getTime()) / 60_000));
  if (minutes < 90) return `${minutes} min ago`;
  const hours = Math.round(minutes / 60);
  return hours < 48 ? `${hours} h ago` : `${Math.round(hours / 24)} d ago`;
}
