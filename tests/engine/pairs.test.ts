import { describe, expect, it } from 'vitest';
import { solveWater } from '@/lib/engine';
import { CARBONATE_PAIRS } from './waters';
import { randomWaters } from '../../docker-free-scripts/bench/random-waters';

const WATERS = 2000;
const SEED = 77;

describe('any two of pH, alkalinity, inorganic carbon and CO2 pressure', () => {
  it.each(CARBONATE_PAIRS)(
    '%s and %s find the same water again, acid or alkaline, thin or salt',
    (a, b) => {
      const stream = randomWaters(SEED);
      let asked = 0;
      for (let i = 0; i < WATERS; i++) {
        const { temperatureC, analytesMgL, ...given } = stream.next().value;
        const analysis = { temperatureC, analytesMgL, ...given };
        const solved = solveWater(analysis);
        if (!solved.ok || solved.water.ionicStrengthMolKg > 0.5) continue;
        const { water } = solved;
        if (!(water.carbonDioxideAtm > 0)) continue;
        asked++;
        const again = solveWater({
          temperatureC,
          analytesMgL,
          [a]: water[a],
          [b]: water[b],
        });
        if (!again.ok) throw new Error(`${again.message} ${JSON.stringify(analysis)}`);
        expect(Math.abs(again.water.pH - water.pH)).toBeLessThan(1e-9);
      }
      expect(asked).toBeGreaterThan(WATERS * 0.9);
    },
  );

  it('of which pressure alone asks for more carbon than there is are refused by name', () => {
    const refused = solveWater({
      temperatureC: 10,
      carbonDioxideAtm: 0.1,
      inorganicCarbonMgLC: 1,
      analytesMgL: {},
    });
    expect(refused).toMatchObject({ ok: false, path: 'inorganicCarbonMgLC' });
  });
});
