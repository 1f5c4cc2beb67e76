import { REAGENTS, type ReagentKey } from '@/lib/engine';
import { formatFormula, formatNumber } from '@/lib/format';
import { TARGET_KEYS, TARGETS } from './quantities';

const isReagent = (key: string): key is ReagentKey => key in REAGENTS;

/** `12.40 mg/L hydrated lime as Ca(OH)₂` */
export function doseWords({ reagent, doseMgL }: { reagent: string; doseMgL: number }): string {
  const dose = `${formatNumber(doseMgL, 2)} mg/L`;
  if (!isReagent(reagent)) return `${dose} ${reagent}`;
  const { name, doseBasis } = REAGENTS[reagent];
  return `${dose} ${name} ${formatFormula(doseBasis)}`;
}

/** `pH 8.20`, `total alkalinity 40.0 mg/L as CaCO₃` */
export function targetWords(quantity: string, value: number): string {
  const key = TARGET_KEYS.find((candidate) => candidate === quantity);
  if (key === undefined) return `${quantity} ${value}`;
  const { label, unit, decimals } = TARGETS[key];
  const name = label === 'pH' ? label : `${label.charAt(0).toLowerCase()}${label.slice(1)}`;
  return `${name} ${formatNumber(value, decimals)}${unit === '' ? '' : ` ${unit}`}`;
}
