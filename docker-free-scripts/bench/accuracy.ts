/** Prints how far the engine lies from published values and from an independent high-precision solve: mean and worst. */
import fc from 'fast-check';
import { CONSTANTS_HASH, ENGINE_VERSION, solveWater, type WaterAnalysis } from '../../lib/engine';
import { debyeHuckelAt, waterDensityKgM3 } from '../../lib/engine/activity/water-properties';
import { CACO3_MG_PER_EQ } from '../../lib/engine/constants/carbonate-equivalents';
import { ATOMIC_WEIGHTS as M } from '../../lib/engine/constants/elements';
import { CONSTANT_ROWS } from '../../lib/engine/constants/table';
import { logKAt } from '../../lib/engine/constants/temperature';
import { disinfect } from '../../lib/engine';
import { solvePrecisely } from '../../tests/engine/high-precision';
import activity from '../../tests/engine/published/activity-density.json';
import carbonate from '../../tests/engine/published/carbonate-constants.json';
import ctTables from '../../tests/engine/published/ct-tables.json';
import standards from '../../tests/engine/published/ph-standards.json';
import saturation from '../../tests/engine/published/saturation-tables.json';
import { anyWater } from '../../tests/engine/waters';

interface Quantity {
  readonly name: string;
  readonly source: string;
  readonly gaps: readonly number[];
  readonly samples: number;
  readonly tolerance: number;
}

const PRECISE_WATERS = 60;

const logK = (key: string, temperatureC: number): number => {
  const row = CONSTANT_ROWS.find((candidate) => candidate.key === key);
  return row ? logKAt(row, temperatureC) : NaN;
};

const against = (
  name: string,
  source: string,
  axis: readonly number[],
  published: readonly (number | null)[],
  found: (at: number) => number,
  tolerance: number,
): Quantity => {
  const pairs = axis.flatMap((at, i) => {
    const value = published[i];
    return value === null || value === undefined ? [] : [found(at) - value];
  });
  const samples = published.filter((value) => value !== null).length;
  return { name, source, gaps: pairs, samples, tolerance };
};

function standardPH(analysis: (temperatureC: number) => WaterAnalysis) {
  return (temperatureC: number): number => {
    const solved = solveWater(analysis(temperatureC));
    return solved.ok ? solved.water.pH : NaN;
  };
}

const carbonateBuffer = standardPH((temperatureC) => ({
  temperatureC,
  alkalinityMgLCaCO3: 0.075 * CACO3_MG_PER_EQ,
  inorganicCarbonMgLC: 50 * M.C,
  analytesMgL: { sodium: 75 * M.Na },
}));
const phosphateBuffer = standardPH((temperatureC) => ({
  temperatureC,
  alkalinityMgLCaCO3: 0.025 * CACO3_MG_PER_EQ,
  inorganicCarbonMgLC: 0,
  analytesMgL: { sodium: 50 * M.Na, potassium: 25 * M.K, phosphate: 50 * M.P },
}));

function highPrecision(): readonly Quantity[] {
  const pH: number[] = [];
  const species: number[] = [];
  for (const analysis of fc.sample(anyWater, { numRuns: PRECISE_WATERS, seed: 77 })) {
    const solved = solveWater(analysis);
    if (!solved.ok) continue;
    const precise = solvePrecisely(solved.water);
    pH.push(precise.pH - solved.water.pH);
    let worst = 0;
    for (const [key, amount] of precise.speciesMolKg) {
      if (amount < 1e-200) continue;
      worst = Math.max(worst, Math.abs((solved.water.speciesMolKg[key] ?? NaN) / amount - 1));
    }
    species.push(worst);
  }
  const source = 'the same model solved again at 32 digits';
  const samples = PRECISE_WATERS;
  return [
    { name: 'pH', source, gaps: pH, samples, tolerance: 1e-9 },
    {
      name: 'worst species of a water (relative)',
      source,
      gaps: species,
      samples,
      tolerance: 1e-8,
    },
  ];
}

function giardia(): Quantity {
  const {
    residual_rows_mg_L_as_Cl2: residuals,
    pH_columns: columns,
    values,
  } = ctTables.giardia_free_chlorine_3log;
  const gaps = Object.entries(values).flatMap(([celsius, rows]) =>
    rows.flatMap((row, r) =>
      row.map((ct, p) => {
        const done = disinfect({
          agent: 'chlorine',
          organism: 'giardia',
          temperatureC: Number(celsius),
          pH: columns[p] ?? NaN,
          residualMgL: residuals[r] ?? NaN,
          ctMgMinL: ct,
        });
        return done.ok ? (done.ctRequiredMgMinL['3'] ?? NaN) - ct : NaN;
      }),
    ),
  );
  const source = '40 CFR 141.74 (from memory)';
  return { name: 'CT, Giardia by chlorine, 3 log', source, gaps, samples: 588, tolerance: 0 };
}

const { harned_davis_1943_K1: k1, harned_scholes_1941_K2: k2, kw } = carbonate;
const { table: sm } = saturation.sm2330B;
const { freeze_cherry_1979: freeze } = activity.debye_huckel;
const densities = Object.entries(activity.water_density.check_values_kg_m3.values);
const memory = '(from memory)';

const quantities: readonly Quantity[] = [
  against(
    'pH, carbonate standard',
    `IUPAC 2002 ${memory}`,
    standards.temps_C,
    standards.values['NaHCO3_0.025m_Na2CO3_0.025m'],
    carbonateBuffer,
    0.012,
  ),
  against(
    'pH, phosphate standard',
    `IUPAC 2002 ${memory}`,
    standards.temps_C,
    standards.values['KH2PO4_0.025m_Na2HPO4_0.025m'],
    phosphateBuffer,
    0.012,
  ),
  against(
    'pK1',
    `Harned & Davis 1943 ${memory}`,
    k1.temps_C,
    k1.pK1,
    (t) => -logK('HCO3-', t),
    0.006,
  ),
  against(
    'pK2',
    `Harned & Scholes 1941 ${memory}`,
    k2.temps_C,
    k2.pK2,
    (t) => -logK('CO3--', t),
    0.01,
  ),
  against(
    'pKw',
    `Harned & Owen ${memory}`,
    kw.harned_owen.temps_C,
    kw.harned_owen.pKw,
    (t) => -logK('OH-', t),
    0.025,
  ),
  against(
    'pK calcite',
    `Standard Methods 2330 ${memory}`,
    sm.T_C,
    sm.pKsc,
    (t) => -logK('calcite', t),
    0.0056,
  ),
  against(
    'pK aragonite',
    `Standard Methods 2330 ${memory}`,
    sm.T_C,
    sm.pKsa,
    (t) => -logK('aragonite', t),
    0.0056,
  ),
  against(
    'pK vaterite',
    `Standard Methods 2330 ${memory}`,
    sm.T_C,
    sm.pKsv,
    (t) => -logK('vaterite', t),
    0.0056,
  ),
  against(
    'Debye–Hückel A',
    'Freeze & Cherry 1979',
    freeze.T_C,
    freeze.A,
    (t) => debyeHuckelAt(t).a,
    0.006,
  ),
  against(
    'Debye–Hückel B',
    'Freeze & Cherry 1979',
    freeze.T_C,
    freeze.B,
    (t) => debyeHuckelAt(t).b,
    0.002,
  ),
  against(
    'density of water, kg/m³',
    `CIPM 2001 ${memory}`,
    densities.map(([t]) => Number(t)),
    densities.map(([, d]) => d),
    waterDensityKgM3,
    0.011,
  ),
  giardia(),
  ...highPrecision(),
];

let failed = false;
const rows = quantities.map(({ name, source, gaps, samples, tolerance }) => {
  const sizes = gaps.map(Math.abs);
  const mean = sizes.reduce((sum, size) => sum + size, 0) / sizes.length;
  const worst = sizes.reduce((most, size) => (size > most || Number.isNaN(size) ? size : most), 0);
  const met = gaps.length === samples && worst <= tolerance;
  failed ||= !met;
  const digits = (value: number) => value.toPrecision(2);
  return `| ${name} | ${source} | ${gaps.length} of ${samples} | ${digits(mean)} | ${digits(worst)} | ${tolerance} | ${met ? 'yes' : 'NO'} |`;
});
process.stdout.write(
  [
    `Engine ${ENGINE_VERSION}, constants ${CONSTANTS_HASH}`,
    '',
    '| quantity | against | samples | mean gap | worst gap | tolerance | met |',
    '|---|---|---|---|---|---|---|',
    ...rows,
    '',
  ].join('\n'),
);
process.exitCode = failed ? 1 : 0;
