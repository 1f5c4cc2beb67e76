import { Decimal } from 'decimal.js';
import type { Water } from '@/lib/engine';
import { ION_SIZES } from '@/lib/engine/constants/ion-sizes';
import { COMPONENTS, type Component } from '@/lib/engine/constants/components';
import { CACO3_MG_PER_EQ } from '@/lib/engine/constants/carbonate-equivalents';
import { CONSTANT_ROWS } from '@/lib/engine/constants/table';
import type { ConstantRow } from '@/lib/engine/constants/row';

/**
 * The same chemistry written again with 32 digits, sharing only the table of constants: own reading of the reactions, own
 * activity formulas, another method (Newton on the logarithms of the basis activities in amounts, ionic strength
 * lagged until it stands still).
 */
const D = Decimal.clone({ precision: 32 });
type Num = Decimal;
const LN10 = D.ln(10);

interface Species {
  readonly key: string;
  readonly charge: number;
  /** Moles of each basis species. */
  readonly parts: ReadonlyMap<string, number>;
  readonly lnK: Num;
}

const charge = (key: string): number =>
  (key.match(/\+/g) ?? []).length - (key.match(/-/g) ?? []).length;

function terms(reaction: string): Map<string, number> {
  const found = new Map<string, number>();
  reaction.split(' = ').forEach((side, i) => {
    for (const term of side.split(' + ')) {
      const digits = /^\d*/.exec(term)?.[0] ?? '';
      const key = term.slice(digits.length);
      found.set(key, (found.get(key) ?? 0) + (i === 0 ? -1 : 1) * Number(digits || 1));
    }
  });
  found.delete('H2O');
  return found;
}

function lnKOf(row: ConstantRow, kelvin: Num): Num {
  if (row.analytic) {
    const [a, b, c, d, e] = row.analytic.map((x) => new D(x));
    if (!a || !b || !c || !d || !e) throw new Error(row.key);
    const log = a
      .plus(b.times(kelvin))
      .plus(c.div(kelvin))
      .plus(d.times(D.log10(kelvin)));
    return log.plus(e.div(kelvin.times(kelvin))).times(LN10);
  }
  const at25 = new D(row.logK25).times(LN10);
  if (row.deltaHKJMol === undefined) return at25;
  const inverse = new D(1).div(new D('298.15')).minus(new D(1).div(kelvin));
  return at25.plus(new D(row.deltaHKJMol).div(new D('0.00831446261815324')).times(inverse));
}

function build(kelvin: Num, present: ReadonlySet<string>): Species[] {
  const known = new Map<string, Species>();
  for (const key of present) {
    known.set(key, { key, charge: charge(key), parts: new Map([[key, 1]]), lnK: new D(0) });
  }
  for (const row of CONSTANT_ROWS) {
    const reaction = terms(row.reaction);
    const own = reaction.get(row.key);
    if (own === undefined || row.key.includes('(g)')) continue;
    const parts = new Map<string, number>();
    let lnK = lnKOf(row, kelvin);
    let possible = true;
    for (const [key, n] of reaction) {
      if (key === row.key) continue;
      const part = known.get(key);
      if (!part) {
        possible = false;
        break;
      }
      lnK = lnK.minus(part.lnK.times(n));
      for (const [basis, count] of part.parts) {
        parts.set(basis, (parts.get(basis) ?? 0) - (n * count) / own);
      }
    }
    if (possible)
      known.set(row.key, { key: row.key, charge: charge(row.key), parts, lnK: lnK.div(own) });
  }
  return [...known.values()];
}

function debyeHuckel(celsius: Num, kelvin: Num): { a: Num; b: Num } {
  const c = (x: string) => new D(x);
  const t = celsius;
  const powers = [
    c('999.83952'),
    c('16.945176'),
    c('-7.9870401e-3'),
    c('-46.170461e-6'),
    c('105.56302e-9'),
    c('-280.54253e-12'),
  ];
  const top = powers.reduce((sum, p, i) => sum.plus(p.times(t.pow(i))), c('0'));
  const density = top.div(c('1').plus(c('16.87985e-3').times(t))).div(1000);
  const permittivity = c('87.74')
    .minus(c('0.40008').times(t))
    .plus(c('9.398e-4').times(t.pow(2)))
    .minus(c('1.41e-6').times(t.pow(3)));
  const product = permittivity.times(kelvin);
  return {
    a: c('1.82483e6').times(density.sqrt()).div(product.pow('1.5')),
    b: c('50.2916').times(density.sqrt()).div(product.sqrt()),
  };
}

function lnGamma(species: Species, ionic: Num, { a, b }: { a: Num; b: Num }): Num {
  if (species.charge === 0) return ionic.div(10).times(LN10);
  const z2 = species.charge ** 2;
  const root = ionic.sqrt();
  const size = ION_SIZES[species.key];
  if (!size) {
    const davies = root.div(root.plus(1)).minus(ionic.times('0.3'));
    return a.times(-z2).times(davies).times(LN10);
  }
  const extended = root.div(b.times(size.aAngstrom).times(root).plus(1));
  return a.times(-z2).times(extended).plus(ionic.times(size.b)).times(LN10);
}

/** Gaussian elimination with partial pivoting. */
function solve(matrix: Num[][], right: Num[]): Num[] {
  const n = right.length;
  const m = matrix.map((row, i) => [...row, right[i] ?? new D(0)]);
  for (let k = 0; k < n; k++) {
    let best = k;
    for (let i = k + 1; i < n; i++) {
      if (m[i]?.[k]?.abs().gt(m[best]?.[k]?.abs() ?? 0)) best = i;
    }
    [m[k], m[best]] = [m[best] ?? [], m[k] ?? []];
    const pivot = m[k] ?? [];
    for (let i = k + 1; i < n; i++) {
      const row = m[i] ?? [];
      const factor = (row[k] ?? new D(0)).div(pivot[k] ?? 1);
      if (factor.isZero()) continue;
      for (let j = k; j <= n; j++) row[j] = (row[j] ?? new D(0)).minus(factor.times(pivot[j] ?? 0));
    }
  }
  const x: Num[] = new Array<Num>(n).fill(new D(0));
  for (let i = n - 1; i >= 0; i--) {
    let sum = m[i]?.[n] ?? new D(0);
    for (let j = i + 1; j < n; j++) sum = sum.minus((m[i]?.[j] ?? new D(0)).times(x[j] ?? 0));
    x[i] = sum.div(m[i]?.[i] ?? 1);
  }
  return x;
}

export interface PreciseWater {
  readonly pH: number;
  readonly speciesMolKg: ReadonlyMap<string, number>;
  readonly lnActivity: ReadonlyMap<string, number>;
}

/** Solves a water's totals and alkalinity again, from its own answer blurred by some 20 %. */
export function solvePrecisely(water: Water): PreciseWater {
  const celsius = new D(water.temperatureC);
  const kelvin = celsius.plus('273.15');
  const totals = new Map<string, Num>();
  for (const [key, total] of Object.entries(water.totalsMolKg)) {
    if (key !== 'charge') totals.set(COMPONENTS[key as Component], new D(total));
  }
  totals.set('H+', new D(-water.alkalinityMgLCaCO3).div(CACO3_MG_PER_EQ));
  const basis = [...totals.keys()];
  const all = build(kelvin, new Set(basis));
  const slopes = debyeHuckel(celsius, kelvin);
  const x = basis.map((key, i) =>
    D.ln(water.activities[key] ?? 1).plus((i % 2 === 0 ? 0.2 : -0.2) * (key === 'H+' ? 0.3 : 1)),
  );
  let ionic = new D(water.ionicStrengthMolKg).times('1.1');
  const columns = all.map((species) =>
    [...species.parts].flatMap(([key, n]) => (n === 0 ? [] : [[basis.indexOf(key), n] as const])),
  );
  for (let round = 0; round < 60; round++) {
    const gammas = new Map<string, Num>();
    const gammaOf = (species: Species): Num => {
      const group = ION_SIZES[species.key] ? species.key : String(Math.abs(species.charge));
      const known = gammas.get(group) ?? lnGamma(species, ionic, slopes);
      gammas.set(group, known);
      return known;
    };
    const amounts = all.map((species, i) => {
      let exponent = species.lnK.minus(gammaOf(species));
      for (const [j, n] of columns[i] ?? []) {
        exponent = exponent.plus((x[j] ?? new D(0)).times(n));
      }
      return D.exp(exponent);
    });
    const sums = basis.map(() => new D(0));
    const sizes = basis.map(() => new D(0));
    const jacobian = basis.map(() => basis.map(() => new D(0)));
    let strength = new D(0);
    all.forEach((species, i) => {
      const amount = amounts[i] ?? new D(0);
      if (species.charge !== 0) strength = strength.plus(amount.times(species.charge ** 2 / 2));
      for (const [j, n] of columns[i] ?? []) {
        const part = amount.times(n);
        sums[j] = (sums[j] ?? new D(0)).plus(part);
        sizes[j] = (sizes[j] ?? new D(0)).plus(part.abs());
        const row = jacobian[j] ?? [];
        for (const [k, o] of columns[i] ?? []) row[k] = (row[k] ?? new D(0)).plus(part.times(o));
      }
    });
    const gaps = basis.map((key, j) => (totals.get(key) ?? new D(0)).minus(sums[j] ?? 0));
    const worst = D.max(
      ...gaps.map((gap, j) => gap.abs().div(sizes[j] ?? 1)),
      strength.minus(ionic).abs().div(ionic),
    );
    if (worst.lt('1e-15')) {
      const lnActivity = new Map(basis.map((key, j) => [key, (x[j] ?? new D(0)).toNumber()]));
      const speciesMolKg = new Map(all.map((s, i) => [s.key, (amounts[i] ?? new D(0)).toNumber()]));
      const pH = (x[basis.indexOf('H+')] ?? new D(0)).div(LN10).neg().toNumber();
      return { pH, speciesMolKg, lnActivity };
    }
    solve(jacobian, gaps).forEach((step, j) => {
      const held = D.max(-2, D.min(2, step));
      x[j] = (x[j] ?? new D(0)).plus(held);
    });
    ionic = strength;
  }
  throw new Error('the high-precision solve did not settle');
}
