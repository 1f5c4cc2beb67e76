import { describe, expect, it } from 'vitest';
import { ATOMIC_WEIGHTS, type Element } from '@/lib/engine/constants/elements';
import { atomsIn, chargeOf, parseReaction } from '@/lib/engine/constants/notation';
import { SOURCES } from '@/lib/engine/constants/sources';
import { CONSTANT_ROWS, CONSTANTS_HASH, SOLIDS, SPECIES } from '@/lib/engine/constants/table';
import { GAS_CONSTANT_KJ, logKAt } from '@/lib/engine/constants/temperature';
import type { ConstantRow } from '@/lib/engine/constants/row';
import carbonate from './published/carbonate-constants.json';
import reference from './published/constants.json';
import leadCopper from './published/lead-copper.json';
import saturation from './published/saturation-tables.json';

const rowOf = (key: string): ConstantRow => {
  const row = CONSTANT_ROWS.find((candidate) => candidate.key === key);
  if (!row) throw new Error(`No row ${key}`);
  return row;
};

describe('every row of the constants table', () => {
  it.each(CONSTANT_ROWS.map((row) => [row.key, row] as const))('%s is balanced', (_, row) => {
    const totals = new Map<Element | 'charge', number>();
    for (const [key, coefficient] of parseReaction(row.reaction)) {
      const atoms = atomsIn(key);
      expect(atoms, key).not.toBeNull();
      for (const [element, count] of atoms ?? []) {
        totals.set(element, (totals.get(element) ?? 0) + coefficient * count);
      }
      totals.set('charge', (totals.get('charge') ?? 0) + coefficient * chargeOf(key));
    }
    expect([...totals].filter(([, sum]) => sum !== 0)).toEqual([]);
  });

  it('has a source, a range and a unique key within its kind', () => {
    for (const row of CONSTANT_ROWS) {
      expect(SOURCES[row.source].length).toBeGreaterThan(5);
      expect(row.rangeC[0]).toBeLessThan(row.rangeC[1]);
    }
    for (const list of [SPECIES, SOLIDS]) {
      expect(new Set(list.map((entry) => entry.key)).size).toBe(list.length);
    }
  });

  it('carries charge in its composition', () => {
    for (const { key, charge, composition } of SPECIES) {
      const found = SPECIES.slice(0, composition.length).reduce(
        (sum, basis, column) => sum + basis.charge * (composition[column] ?? 0),
        0,
      );
      expect(found, key).toBe(charge);
    }
  });

  it.each(CONSTANT_ROWS.filter((row) => row.analytic).map((row) => [row.key, row] as const))(
    '%s: its expression gives its value at 25 °C within the rounding of the value',
    (_, row) => {
      const decimals = String(row.logK25).split('.')[1]?.length ?? 0;
      const rounding = decimals > 1 ? 0.02 : 0.05;
      expect(Math.abs(logKAt(row, 25) - row.logK25)).toBeLessThan(rounding);
    },
  );

  // The slope of log K by 1/T is minus the enthalpy: a slip in any coefficient shows.
  const withBoth = CONSTANT_ROWS.filter((row) => row.analytic && row.deltaHKJMol !== undefined);
  it.each(withBoth.map((row) => [row.key, row] as const))(
    '%s: the slope of its expression is its enthalpy within 1.5 kJ/mol',
    (_, row) => {
      const step = 0.01;
      const rise = logKAt(row, 25 + step) - logKAt(row, 25 - step);
      const inverse = 1 / (298.15 - step) - 1 / (298.15 + step);
      const enthalpy = (rise / inverse) * GAS_CONSTANT_KJ * Math.LN10;
      expect(Math.abs(enthalpy - (row.deltaHKJMol ?? NaN))).toBeLessThan(1.5);
    },
  );

  it('is named by a hash of sixteen hexadecimal digits', () => {
    expect(CONSTANTS_HASH).toMatch(/^[0-9a-f]{16}$/);
  });
});

describe('the carbonate system against published tables', () => {
  const expressions = [
    ['CO2(g)', 'logKH'],
    ['HCO3-', 'logK1'],
    ['CO3--', 'logK2'],
    ['calcite', 'calcite'],
    ['aragonite', 'aragonite'],
    ['vaterite', 'vaterite'],
    ['CaHCO3+', 'CaHCO3+_assoc'],
    ['CaCO3(aq)', 'CaCO3aq_assoc'],
  ] as const;

  it.each(expressions)('%s follows its expression from 0 to 90 °C', (key, name) => {
    const table = carbonate.plummer_busenberg_1982.table_recomputed_0_90C[name];
    const entries = Object.entries(table);
    expect(entries).toHaveLength(19);
    for (const [celsius, value] of entries) {
      expect(logKAt(rowOf(key), Number(celsius)), `${celsius} °C`).toBeCloseTo(value, 3);
    }
  });

  it.each(Object.entries(carbonate.plummer_busenberg_1982.published_25C))(
    '%s at 25 °C is the published value within its uncertainty',
    (name, [value, uncertainty]) => {
      const key = expressions.find(([, published]) => published === name)?.[0] ?? name;
      expect(Math.abs(logKAt(rowOf(key), 25) - (value ?? NaN))).toBeLessThanOrEqual(
        uncertainty ?? 0,
      );
    },
  );

  // Independent measurements by cell, recalled from memory: Harned & Davis 1943, Harned & Scholes 1941.
  const measured = [
    ['HCO3-', carbonate.harned_davis_1943_K1.temps_C, carbonate.harned_davis_1943_K1.pK1, 0.006],
    ['CO3--', carbonate.harned_scholes_1941_K2.temps_C, carbonate.harned_scholes_1941_K2.pK2, 0.01],
    ['OH-', carbonate.kw.harned_owen.temps_C, carbonate.kw.harned_owen.pKw, 0.025],
  ] as const;
  it.each(measured)('%s agrees with the cell measurements', (key, celsius, pK, tolerance) => {
    celsius.forEach((temperatureC, i) => {
      const gap = logKAt(rowOf(key), temperatureC) + (pK[i] ?? NaN);
      expect(Math.abs(gap), `${temperatureC} °C`).toBeLessThanOrEqual(tolerance);
    });
  });

  it('gives the solubility of CO2 within 1.5 % of Harned & Davis 1943 to 30 °C (from memory)', () => {
    const { temps_C: celsius, KH_mol_per_kg_atm: published } = carbonate.harned_davis_1943_KH;
    celsius.forEach((temperatureC, i) => {
      const ratio = 10 ** logKAt(rowOf('CO2(g)'), temperatureC) / (published[i] ?? NaN);
      expect(Math.abs(ratio - 1), `${temperatureC} °C`).toBeLessThan(0.015);
    });
  });

  it('rounds to the constants of Standard Methods 2330 (from memory)', () => {
    const { table } = saturation.sm2330B;
    const columns = [
      ['CO3--', table.pK2],
      ['calcite', table.pKsc],
      ['aragonite', table.pKsa],
      ['vaterite', table.pKsv],
      ['OH-', table.pKw],
    ] as const;
    let compared = 0;
    for (const [key, column] of columns) {
      table.T_C.forEach((temperatureC, i) => {
        const published = column[i];
        if (published === null || published === undefined) return;
        compared++;
        const gap = Math.abs(logKAt(rowOf(key), temperatureC) + published);
        // pKw of 2330 is Harned & Owen's equation, carried beyond 50 °C; ours is Nordstrom's.
        expect(gap, `${key} ${temperatureC}`).toBeLessThanOrEqual(key === 'OH-' ? 0.02 : 0.0056);
      });
    }
    expect(compared).toBe(67);
  });
});

/** Reference names that differ from ours, and what is deliberately not used, with the reason. */
const OTHER_NAMES: Readonly<Record<string, string>> = {
  Kw: 'OH-',
  'CO2 Henry': 'CO2(g)',
  'H2CO3* K1': 'HCO3-',
  K2: 'CO3--',
  'H4SiO4 1': 'H3SiO4-',
  'H4SiO4 2': 'H2SiO4--',
  'B(OH)3': 'B(OH)4-',
  'NH4+': 'NH3',
  'HOCl Morris 1966': 'OCl-',
  H2S: 'HS-',
  'H3PO4 1': 'H3PO4',
  'H3PO4 2': 'HPO4--',
  'H3PO4 3': 'PO4---',
  AlF3: 'AlF3(aq)',
  'Fe2(OH)2': 'Fe2(OH)2++++',
  'FeOH+ (Fe II)': 'FeOH+',
  'dolomite ordered': 'dolomite',
  'dolomite disordered': 'disordered-dolomite',
  'siderite crystalline': 'siderite',
  'siderite precipitated': 'fresh-siderite',
  'rhodochrosite crystalline': 'rhodochrosite',
  'rhodochrosite synthetic': 'fresh-rhodochrosite',
  'gibbsite crystalline': 'gibbsite',
  'Al(OH)3 microcrystalline': 'microcrystalline-aluminum-hydroxide',
  'Al(OH)3 amorphous': 'aluminum-hydroxide',
  'amorphous silica': 'amorphous-silica',
  'hydroxyapatite (McDowell 1977)': 'hydroxyapatite',
  'brushite (DCPD)': 'brushite',
  'struvite (Ohlinger 1998)': 'struvite',
};
const NOT_USED: Readonly<Record<string, string>> = {
  'NaCO3-': 'puts the carbonate pH standard 0.15 low',
  'NaHCO3(aq)': 'goes with the pair above',
  'NH4+ Emerson 1975': 'within 0.002 of the row used',
  'NH4+ Bates & Pinching 1949': 'within 0.001 of the row used',
  'Cl2 hydrolysis': 'molecular chlorine does not exist at the pH of drinking water',
  'H2PO4- overall': 'sum of two rows that are used',
  hydroxyapatite: 'four units more soluble than the measurement from both sides that is used',
  'struvite (Bhuiyan 2007)': 'within 0.1 of the row used',
  'struvite (Hanhoun 2011)': 'within 0.1 of the row used',
};

describe('the reference compilation', () => {
  const used = reference.reactions.filter(({ name }) => !(name in NOT_USED));

  it.each(used.map((entry) => [entry.name, entry] as const))(
    '%s is in the table with its value at 25 °C',
    (name, entry) => {
      const row = rowOf(OTHER_NAMES[name] ?? name);
      expect(Math.abs(row.logK25 - entry.logK25)).toBeLessThan(0.011);
    },
  );

  it('is used whole but for the rows named with their reason', () => {
    expect(used.length + Object.keys(NOT_USED).length).toBe(98);
    expect(reference.reactions).toHaveLength(98);
  });

  it('has lead and copper as compiled, complex by complex and solid by solid', () => {
    const published = [
      ...Object.entries(leadCopper.lead.schock_constants.aqueous_log_beta),
      ...Object.entries(leadCopper.copper.constants.aqueous_log_beta),
      ...Object.entries(leadCopper.lead.schock_constants.solids),
      ...Object.entries(leadCopper.copper.constants.solids),
    ];
    const values = CONSTANT_ROWS.filter((row) => /Pb|Cu/.test(row.reaction)).map(
      (row) => row.logK25,
    );
    const missing = published.filter(([, value]) => !values.includes(value));
    expect(published).toHaveLength(39);
    expect(missing).toEqual([]);
  });
});

it('uses the atomic weights the factors were computed with', () => {
  expect(ATOMIC_WEIGHTS.Ca + ATOMIC_WEIGHTS.C + 3 * ATOMIC_WEIGHTS.O).toBeCloseTo(100.086, 3);
});
