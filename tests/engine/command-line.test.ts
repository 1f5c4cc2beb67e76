import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));

interface Ran {
  readonly status: number | null;
  readonly lines: readonly Record<string, unknown>[];
  readonly stderr: string;
}

/** Runs the command line on lines given as objects, or as text for what is not JSON. */
function run(verb: string, lines: readonly unknown[], ...options: readonly string[]): Ran {
  const input = lines
    .map((line) => (typeof line === 'string' ? line : JSON.stringify(line)))
    .join('\n');
  const done = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'docker-free-scripts/engine.ts', verb, ...options],
    {
      cwd: root,
      input: input === '' ? '' : `${input}\n`,
      encoding: 'utf8',
      timeout: 30_000,
    },
  );
  const out = done.stdout.split('\n').filter((line) => line !== '');
  return {
    status: done.status,
    lines: out.map((line) => JSON.parse(line) as Record<string, unknown>),
    stderr: done.stderr,
  };
}

const water = {
  temperature: 20,
  pH: 7.8,
  alkalinity: 120,
  analytes: { calcium: 60, magnesium: 10, sodium: 20, chloride: 30, sulfate: 40 },
};

describe('the engine on the command line', () => {
  it('speciates, line by line and in order, with every field named in the specification', () => {
    const { status, lines } = run('speciate', [
      { id: 'a', water },
      { id: 2, water: { ...water, pH: undefined, pCO2: 0.002 }, equilibrateWith: ['calcite'] },
    ]);
    expect(status).toBe(0);
    expect(lines.map((line) => line['id'])).toEqual(['a', 2]);
    for (const field of [
      'pH alkalinity inorganicCarbon carbonDioxide ionicStrength chargeBalance saturationIndex langelier pHs',
      'precipitationPotential ryznar puckorius aggressiveness larson chlorideSulfateMassRatio bufferIntensity',
      'species assumptions',
    ].flatMap((text) => text.split(' '))) {
      expect(lines[0], field).toHaveProperty(field);
    }
    expect(lines[1]).toHaveProperty('precipitated.calcite');
    expect(lines[0]?.['alkalinity']).toBeCloseTo(120, 9);
  });

  it('answers good lines beside bad ones and exits 1', () => {
    const { status, lines } = run('speciate', [
      { id: 1, water },
      'not JSON',
      { id: 3, water: { ...water, analytes: { gold: 1 } } },
      { id: 4, water: { ...water, temperature: '20' } },
      { id: 5 },
      { id: 6, water },
    ]);
    expect(status).toBe(1);
    expect(lines).toHaveLength(6);
    expect(lines[1]).toMatchObject({ id: null, error: { code: 'badInput' } });
    expect(lines[2]).toMatchObject({ id: 3, error: { path: 'water.analytes.gold' } });
    expect(lines[3]).toMatchObject({ id: 4, error: { path: 'water.temperature' } });
    expect(lines[4]).toMatchObject({ id: 5, error: { path: 'water' } });
    expect(lines[5]?.['pH']).toBeCloseTo(7.8, 9);
  });

  it('doses one after another', () => {
    const { status, lines } = run('dose', [
      {
        id: 1,
        water,
        doses: [
          { reagent: 'aluminum-sulfate', dose: 40 },
          { reagent: 'calcium-hydroxide', dose: 10 },
        ],
      },
      { id: 2, water, doses: [{ reagent: 'aluminum-sulfate', dose: 40 }], solids: 'equilibrium' },
      { id: 3, water, doses: [{ reagent: 'chlorine', dose: -1 }] },
    ]);
    expect(status).toBe(1);
    const steps = lines[0]?.['steps'] as readonly Record<string, number>[];
    expect(steps).toHaveLength(2);
    expect(steps[0]?.['alkalinity']).toBeCloseTo(120 - 40 * 0.50064, 2);
    expect(lines[1]).toHaveProperty(['steps', '0', 'precipitated', 'aluminum-hydroxide']);
    expect(lines[2]).toMatchObject({ error: { code: 'badInput', path: 'doses.0.dose' } });
  });

  it('finds doses for a target, or says what can be reached', () => {
    const { status, lines } = run('target', [
      { id: 1, water, reagent: 'sodium-hydroxide', target: { pH: 8.5 }, max: 50 },
      { id: 2, water, reagent: 'sulfuric-acid', target: { pH: 9 } },
      { id: 3, water, reagent: 'sulfuric-acid', target: { taste: 9 } },
    ]);
    expect(status).toBe(1);
    expect(lines[0]?.['doses']).toHaveLength(1);
    expect(lines[1]).toMatchObject({ doses: [], reachable: {} });
    expect(lines[2]).toMatchObject({ error: { path: 'target.taste' } });
  });

  it('plans', () => {
    const { status, lines } = run('plan', [
      {
        id: 1,
        water,
        reagents: [
          { reagent: 'calcium-hydroxide', max: 60, costPerKg: 0.25 },
          { reagent: 'carbon-dioxide', max: 60, costPerKg: 0.3 },
        ],
        targets: [
          { quantity: 'pH', min: 8, max: 8.3 },
          { quantity: 'alkalinity', min: 140 },
        ],
      },
      {
        id: 2,
        water,
        reagents: [{ reagent: 'carbon-dioxide', max: 60, costPerKg: 0.3 }],
        targets: [{ quantity: 'alkalinity', min: 140 }],
      },
    ]);
    expect(status).toBe(0);
    expect(lines[0]).toMatchObject({ id: 1, feasible: true });
    expect(lines[1]).toMatchObject({
      id: 2,
      feasible: false,
      violation: { quantity: 'alkalinity' },
    });
  });

  it('makes the table of any reactions', () => {
    const { lines } = run('ledger', [
      {
        id: 1,
        reactions: [{ coefficients: { HA: -1, H: 1, A: 1 }, K: 1.8e-5 }],
        initial: { HA: 0.1 },
      },
      {
        id: 2,
        reactions: [{ coefficients: { HA: -1, H: 1, A: 1 }, K: 1.8e-5 }],
        initial: { HA: -1 },
      },
    ]);
    const rows = lines[0]?.['rows'] as readonly Record<string, number | string>[];
    expect(rows.map((row) => row['species'])).toEqual(['HA', 'H', 'A']);
    expect(rows[1]?.['equilibrium']).toBeCloseTo(0.00133267, 8);
    expect(lines[1]).toMatchObject({ error: { path: 'initial.HA' } });
  });

  it('reads the disinfection tables', () => {
    const { lines } = run('disinfect', [
      {
        id: 1,
        agent: 'chlorine',
        organism: 'giardia',
        temperature: 10,
        pH: 7,
        residual: 1,
        ct: 56,
      },
      {
        id: 2,
        agent: 'chlorine',
        organism: 'cryptosporidium',
        temperature: 10,
        pH: 7,
        residual: 1,
        ct: 5,
      },
    ]);
    expect(lines[0]).toMatchObject({ id: 1, logInactivation: 1.5, ctRequired: { '3': 112 } });
    expect(lines[1]).toMatchObject({ error: { path: 'agent' } });
  });

  it('spreads a season of plans over threads: the same answers in the same order, and its progress told', () => {
    const days = Array.from({ length: 40 }, (_, day) => ({
      id: day,
      water: { ...water, temperature: 4 + day / 4 },
      reagents: [{ reagent: 'sodium-hydroxide', max: 40, costPerKg: 0.8 }],
      targets: [{ quantity: 'pH', min: 8.2, max: day === 17 ? 'high' : 8.6 }],
    }));
    const alone = run('plan', days);
    const spread = run('plan', days, '--threads');
    expect(spread.lines).toEqual(alone.lines);
    expect(spread.status).toBe(1);
    expect(spread.lines[17]).toMatchObject({ id: 17, error: { path: 'targets.0.max' } });
    expect(spread.stderr).toContain('answered 40 of 40 lines read');
  });

  it('answers nothing to nothing, and explains itself when misused', () => {
    expect(run('speciate', [])).toMatchObject({ status: 0, lines: [] });
    const misused = run('guess', []);
    expect(misused.status).toBe(2);
    expect(misused.stderr).toContain('speciate');
  });
});
