import { describe, expect, it } from 'vitest';
import { accepted, hardWater, riverWater, softWater, waterOf } from './support';
import {
  applyDoses,
  planDoses,
  type PlanRequest,
  type Water,
  type WaterAnalysis,
} from '@/lib/engine';
import { quantityOf } from '@/lib/engine/planning/quantity';

const cases: readonly {
  readonly name: string;
  readonly analysis: WaterAnalysis;
  readonly request: PlanRequest;
  readonly grid: number;
}[] = [
  {
    name: 'remineralising soft water with lime and carbon dioxide',
    analysis: softWater,
    grid: 60,
    request: {
      reagents: [
        { reagent: 'calcium-hydroxide', maxDoseMgL: 60, costPerKg: 0.25 },
        { reagent: 'carbon-dioxide', maxDoseMgL: 60, costPerKg: 0.3 },
      ],
      targets: [
        { quantity: 'pH', min: 8, max: 8.6 },
        { quantity: 'alkalinity', min: 40 },
        { quantity: 'precipitationPotential', min: -2, max: 4 },
      ],
    },
  },
  {
    name: 'correcting after coagulation by the cheaper of two alkalis',
    analysis: riverWater,
    grid: 14,
    request: {
      reagents: [
        { reagent: 'aluminum-sulfate', minDoseMgL: 30, maxDoseMgL: 30, costPerKg: 0.3 },
        { reagent: 'sodium-hydroxide', maxDoseMgL: 40, costPerKg: 0.6 },
        { reagent: 'calcium-hydroxide', maxDoseMgL: 40, costPerKg: 0.3 },
        { reagent: 'carbon-dioxide', maxDoseMgL: 40, costPerKg: 0.25 },
      ],
      targets: [
        { quantity: 'pH', min: 7.6, max: 8.2 },
        { quantity: 'alkalinity', min: 100 },
        { quantity: 'calciteIndex', min: 0, max: 0.3 },
        { quantity: 'larson', max: 1 },
        { quantity: 'hardness', max: 150 },
      ],
    },
  },
  {
    name: 'acid against scaling in hard water',
    analysis: { ...hardWater, pH: 7.9 },
    grid: 60,
    request: {
      reagents: [
        { reagent: 'sulfuric-acid', maxDoseMgL: 80, costPerKg: 0.4 },
        { reagent: 'hydrochloric-acid', maxDoseMgL: 80, costPerKg: 0.5 },
      ],
      targets: [
        { quantity: 'precipitationPotential', max: 20 },
        { quantity: 'chlorideSulfateMassRatio', min: 0.3 },
      ],
    },
  },
];

const meets = (water: Water, request: PlanRequest, slack: number): boolean =>
  request.targets.every(({ quantity, min, max }) => {
    const value = quantityOf(water, quantity) ?? NaN;
    return (
      (min === undefined || value >= min - slack) && (max === undefined || value <= max + slack)
    );
  });

/** Cheapest feasible point of a grid over the doses. */
function gridSearch(water: Water, request: PlanRequest, points: number): number {
  let best = Infinity;
  const visit = (doses: readonly number[], cost: number): void => {
    if (cost >= best) return;
    const next = request.reagents[doses.length];
    if (!next) {
      const fed = request.reagents.map(({ reagent }, j) => ({ reagent, doseMgL: doses[j] ?? 0 }));
      const last = accepted(applyDoses(water, fed)).waters.at(-1);
      if (last && meets(last, request, 0)) best = cost;
      return;
    }
    const low = next.minDoseMgL ?? 0;
    const steps = next.maxDoseMgL === low ? 0 : points;
    for (let k = 0; k <= steps; k++) {
      const dose = steps === 0 ? low : low + (k / steps) * (next.maxDoseMgL - low);
      visit([...doses, dose], cost + dose * next.costPerKg);
    }
  };
  visit([], 0);
  return best;
}

describe('the cheapest plan', () => {
  it.each(cases)('$name: meets every target, and no grid point is cheaper by 0.5 %', (row) => {
    const water = waterOf(row.analysis);
    const plan = accepted(planDoses(water, row.request));
    expect(plan.feasible).toBe(true);
    const doses = plan.doses.map(({ reagent, doseMgL }) => ({ reagent, doseMgL }));
    const last = accepted(applyDoses(water, doses)).waters.at(-1);
    expect(last && meets(last, row.request, 1e-9)).toBe(true);
    expect(plan.waters.at(-1)?.pH).toBeCloseTo(last?.pH ?? NaN, 9);
    const cost = doses.reduce(
      (sum, dose, j) => sum + dose.doseMgL * (row.request.reagents[j]?.costPerKg ?? 0),
      0,
    );
    expect(plan.costPerML).toBeCloseTo(cost, 9);
    const grid = gridSearch(water, row.request, row.grid);
    expect(grid).toBeLessThan(Infinity);
    expect(plan.costPerML).toBeLessThanOrEqual(grid * 1.005);
  });

  it('takes at most 300 speciations for four reagents and five targets', () => {
    const { analysis, request } = cases[1] ?? {
      analysis: riverWater,
      request: { reagents: [], targets: [] },
    };
    const plan = accepted(planDoses(waterOf(analysis), request));
    expect(plan.evaluations).toBeLessThanOrEqual(300);
  });

  it('says what binds and what a unit of slack saves', () => {
    const { request } = cases[0] ?? { request: { reagents: [], targets: [] } };
    const water = waterOf(softWater);
    const plan = accepted(planDoses(water, request));
    const alkalinity = plan.binding.find((binding) => binding.quantity === 'alkalinity');
    expect(alkalinity?.bound).toBe('min');
    const eased = accepted(
      planDoses(water, {
        ...request,
        targets: request.targets.map((t) => (t.quantity === 'alkalinity' ? { ...t, min: 39 } : t)),
      }),
    );
    expect(plan.costPerML - eased.costPerML).toBeCloseTo(alkalinity?.costPerUnit ?? NaN, 2);
  });

  it('feeds nothing where nothing is needed', () => {
    const plan = accepted(
      planDoses(waterOf(riverWater), {
        reagents: [{ reagent: 'sodium-hydroxide', maxDoseMgL: 30, costPerKg: 1 }],
        targets: [{ quantity: 'pH', min: 7, max: 8 }],
      }),
    );
    expect(plan.doses[0]?.doseMgL).toBe(0);
    expect(plan.costPerML).toBe(0);
  });

  it('keeps a target at a point between the reagents', () => {
    const request: PlanRequest = {
      reagents: [
        { reagent: 'sulfuric-acid', maxDoseMgL: 60, costPerKg: 0.4 },
        { reagent: 'sodium-hydroxide', maxDoseMgL: 60, costPerKg: 0.6 },
      ],
      targets: [
        { quantity: 'pH', max: 6.8, after: 1 },
        { quantity: 'pH', min: 8 },
      ],
    };
    const plan = accepted(planDoses(waterOf(riverWater), request));
    expect(plan.feasible).toBe(true);
    expect(plan.waters[0]?.pH).toBeCloseTo(6.8, 5);
    expect(plan.waters[1]?.pH).toBeCloseTo(8, 5);
  });
});

describe('a plan that cannot be', () => {
  it('names the target no reagent moves and by how much it misses', () => {
    const water = waterOf(softWater);
    const plan = accepted(
      planDoses(water, {
        reagents: [{ reagent: 'sodium-hydroxide', maxDoseMgL: 10, costPerKg: 1 }],
        targets: [
          { quantity: 'hardness', min: 60 },
          { quantity: 'pH', min: 7 },
        ],
      }),
    );
    expect(plan.feasible).toBe(false);
    expect(plan.violations).toHaveLength(1);
    expect(plan.violations[0]).toMatchObject({ quantity: 'hardness', bound: 'min', target: 0 });
    expect(plan.violations[0]?.by).toBeCloseTo(60 - (quantityOf(water, 'hardness') ?? NaN), 3);
    expect(plan.violations[0]?.message).toContain('cannot be at least 60');
  });

  it('returns the doses that miss least when targets oppose each other', () => {
    const plan = accepted(
      planDoses(waterOf(softWater), {
        reagents: [{ reagent: 'sodium-hydroxide', maxDoseMgL: 30, costPerKg: 1 }],
        targets: [
          { quantity: 'pH', min: 9 },
          { quantity: 'alkalinity', max: 15 },
        ],
      }),
    );
    expect(plan.feasible).toBe(false);
    expect(plan.violations.length).toBeGreaterThan(0);
  });
});

describe('a plan is refused', () => {
  const reagents = [{ reagent: 'sodium-hydroxide', maxDoseMgL: 30, costPerKg: 1 }] as const;
  it.each([
    ['without reagents', { reagents: [], targets: [] }, 'reagents'],
    [
      'with an unknown reagent',
      { reagents: [{ ...reagents[0], reagent: 'gold' }], targets: [] },
      'reagents.0.reagent',
    ],
    [
      'with a negative cost',
      { reagents: [{ ...reagents[0], costPerKg: -1 }], targets: [] },
      'reagents.0.costPerKg',
    ],
    [
      'with an unknown quantity',
      { reagents, targets: [{ quantity: 'taste', min: 1 }] },
      'targets.0.quantity',
    ],
    ['with a target without bounds', { reagents, targets: [{ quantity: 'pH' }] }, 'targets.0'],
    [
      'with a range turned round',
      { reagents, targets: [{ quantity: 'pH', min: 9, max: 8 }] },
      'targets.0.min',
    ],
    [
      'with a point beyond the train',
      { reagents, targets: [{ quantity: 'pH', min: 9, after: 2 }] },
      'targets.0.after',
    ],
    ['as a text', 'plan', ''],
  ])('%s', (_, request, path) => {
    const plan = planDoses(waterOf(softWater), request as unknown as PlanRequest);
    expect(plan).toMatchObject({ ok: false, path });
  });
});
