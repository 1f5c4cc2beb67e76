import { describe, expect, it } from 'vitest';
import { riverWater, waterOf } from './support';
import {
  applyDose,
  applyDoses,
  doseForTarget,
  precipitationPotentialAt,
  solveWater,
  type WaterAnalysis,
} from '@/lib/engine';

const { temperatureC, analytesMgL } = riverWater;
const altered = (change: object): WaterAnalysis => ({ ...riverWater, ...change });
const only = (pair: object): WaterAnalysis => ({ temperatureC, analytesMgL, ...pair });

const analyses: readonly (readonly [string, unknown, string, string])[] = [
  ['nothing', undefined, 'badInput', ''],
  ['a text', 'water', 'badInput', ''],
  ['no temperature', altered({ temperatureC: undefined }), 'badInput', 'temperatureC'],
  ['a temperature written as text', altered({ temperatureC: '12' }), 'badInput', 'temperatureC'],
  ['NaN for temperature', altered({ temperatureC: NaN }), 'badInput', 'temperatureC'],
  ['steam', altered({ temperatureC: 90.1 }), 'outOfRange', 'temperatureC'],
  ['ice', altered({ temperatureC: -0.1 }), 'outOfRange', 'temperatureC'],
  ['pH 14.1', altered({ pH: 14.1 }), 'outOfRange', 'pH'],
  ['a negative pH', altered({ pH: -0.1 }), 'outOfRange', 'pH'],
  ['an endless pH', altered({ pH: Infinity }), 'badInput', 'pH'],
  ['only one of the pair', only({ pH: 7 }), 'badInput', 'alkalinityMgLCaCO3'],
  ['three of the pair', altered({ carbonDioxideAtm: 0.001 }), 'badInput', 'carbonDioxideAtm'],
  [
    'negative calcium',
    altered({ analytesMgL: { calcium: -1 } }),
    'badInput',
    'analytesMgL.calcium',
  ],
  [
    'calcium as text',
    altered({ analytesMgL: { calcium: '38' } }),
    'badInput',
    'analytesMgL.calcium',
  ],
  ['NaN calcium', altered({ analytesMgL: { calcium: NaN } }), 'badInput', 'analytesMgL.calcium'],
  [
    'absurd calcium',
    altered({ analytesMgL: { calcium: 1e9 } }),
    'outOfRange',
    'analytesMgL.calcium',
  ],
  ['an unknown analyte', altered({ analytesMgL: { gold: 1 } }), 'badInput', 'analytesMgL.gold'],
  ['no list of analytes', altered({ analytesMgL: null }), 'badInput', 'analytesMgL'],
  ['an array of analytes', altered({ analytesMgL: [1] }), 'badInput', 'analytesMgL'],
  [
    'pH 11 at an alkalinity that hydroxide alone exceeds',
    altered({ pH: 11, alkalinityMgLCaCO3: 10 }),
    'badInput',
    'alkalinityMgLCaCO3',
  ],
  [
    'pH 4 at an alkalinity that needs soda water',
    altered({ pH: 4, alkalinityMgLCaCO3: 300 }),
    'outOfRange',
    'pH',
  ],
  [
    'less carbon than the CO2 pressure dissolves',
    only({ inorganicCarbonMgLC: 0.1, carbonDioxideAtm: 0.01 }),
    'badInput',
    'inorganicCarbonMgLC',
  ],
  [
    'carbon without CO2',
    only({ inorganicCarbonMgLC: 5, carbonDioxideAtm: 0 }),
    'badInput',
    'carbonDioxideAtm',
  ],
  [
    'negative CO2 pressure',
    only({ pH: 7, carbonDioxideAtm: -1 }),
    'outOfRange',
    'carbonDioxideAtm',
  ],
];

describe('an analysis is refused with the path of its fault', () => {
  it.each(analyses)('%s', (_, analysis, reason, path) => {
    expect(solveWater(analysis as WaterAnalysis)).toMatchObject({ ok: false, reason, path });
  });
});

describe('a dose is refused with the path of its fault', () => {
  const water = waterOf(riverWater);
  it.each([
    ['an unknown reagent', { reagent: 'gold', doseMgL: 1 }, 'badInput', 'reagent'],
    ['an inherited name', { reagent: 'toString', doseMgL: 1 }, 'badInput', 'reagent'],
    ['a negative dose', { reagent: 'chlorine', doseMgL: -1 }, 'badInput', 'doseMgL'],
    ['a dose as text', { reagent: 'chlorine', doseMgL: '1' }, 'badInput', 'doseMgL'],
    ['a dose that is no number', { reagent: 'chlorine', doseMgL: NaN }, 'badInput', 'doseMgL'],
    ['a dose beyond all measure', { reagent: 'chlorine', doseMgL: 1e7 }, 'outOfRange', 'doseMgL'],
  ])('%s', (_, dose, reason, path) => {
    expect(applyDose(water, dose as never)).toMatchObject({ ok: false, reason, path });
  });

  it('names its place in a list', () => {
    const doses = [
      { reagent: 'chlorine', doseMgL: 1 },
      { reagent: 'chlorine', doseMgL: -1 },
    ] as const;
    expect(applyDoses(water, doses)).toMatchObject({ ok: false, path: '1.doseMgL' });
  });

  it('refuses a target that is no number, an unknown quantity and an impossible largest dose', () => {
    const target = { quantity: 'pH', value: NaN } as const;
    expect(doseForTarget(water, 'chlorine', target)).toMatchObject({ path: 'target.value' });
    expect(
      doseForTarget(water, 'chlorine', { quantity: 'taste' as never, value: 1 }),
    ).toMatchObject({ path: 'target.quantity' });
    expect(
      doseForTarget(water, 'chlorine', { quantity: 'pH', value: 7 }, { maxDoseMgL: -1 }),
    ).toMatchObject({ path: 'maxDoseMgL' });
  });

  it('refuses a potential at a temperature outside the model and for water without calcium', () => {
    expect(precipitationPotentialAt(water, 120)).toMatchObject({ path: 'temperatureC' });
    const noCalcium = waterOf({ ...riverWater, analytesMgL: { sodium: 10 } });
    expect(precipitationPotentialAt(noCalcium, 20)).toMatchObject({ reason: 'badInput' });
  });
});
