import { describe, expect, it } from 'vitest';
import { accepted } from './support';
import { disinfect, type Contact } from '@/lib/engine';
import * as tables from '@/lib/engine/disinfection/ct-tables';
import published from './published/ct-tables.json';

const contact = (change: Partial<Contact>): Contact => ({
  agent: 'chlorine',
  organism: 'giardia',
  temperatureC: 10,
  pH: 7,
  residualMgL: 1,
  ctMgMinL: 56,
  ...change,
});
const required = (change: Partial<Contact>, log: string): number =>
  accepted(disinfect(contact(change))).ctRequiredMgMinL[log] ?? NaN;

describe('Giardia by free chlorine (tables recalled from memory)', () => {
  const {
    residual_rows_mg_L_as_Cl2: residuals,
    pH_columns: columns,
    values,
  } = published.giardia_free_chlorine_3log;
  const cells = Object.entries(values).flatMap(([celsius, rows]) =>
    rows.flatMap((row, r) =>
      row.map((ct, p) => ({
        temperatureC: Number(celsius),
        residualMgL: residuals[r] ?? NaN,
        pH: columns[p] ?? NaN,
        ct,
      })),
    ),
  );

  it('asks in every printed cell for the printed value, and achieves 3 log there', () => {
    expect(cells).toHaveLength(6 * 14 * 7);
    for (const { ct, ...cell } of cells) {
      const done = accepted(disinfect(contact({ ...cell, ctMgMinL: ct })));
      expect(done.ctRequiredMgMinL['3']).toBe(ct);
      expect(done.logInactivation).toBeCloseTo(3, 12);
    }
  });

  it('asks for the printed share at lower logs, within the rounding of print', () => {
    const rows = published.giardia_free_chlorine_lower_logs.recalled_rows;
    for (const row of rows) {
      row.L.forEach((log, i) => {
        const ct = required({ temperatureC: row.T, residualMgL: row.Cl, pH: row.pH }, String(log));
        expect(Math.abs(ct - (row.CT[i] ?? NaN))).toBeLessThanOrEqual(1);
      });
    }
    expect(rows).toHaveLength(5);
  });

  it('reads between printed values by straight lines', () => {
    expect(required({ temperatureC: 7.5 }, '3')).toBeCloseTo((149 + 112) / 2, 9);
    expect(required({ pH: 7.25 }, '3')).toBeCloseTo((112 + 134) / 2, 9);
    expect(required({ residualMgL: 1.1 }, '3')).toBeCloseTo((112 + 114) / 2, 9);
  });

  it('reads conservatively at the colder, the more alkaline and the higher residual', () => {
    const reading = 'conservative' as const;
    expect(required({ temperatureC: 9.9, pH: 7.1, residualMgL: 1.05, reading }, '3')).toBe(183);
    expect(required({ reading }, '3')).toBe(112);
  });

  it('asks for more in colder, more alkaline and stronger water', () => {
    expect(required({ temperatureC: 5 }, '3')).toBeGreaterThan(required({}, '3'));
    expect(required({ pH: 8 }, '3')).toBeGreaterThan(required({}, '3'));
    expect(required({ residualMgL: 2 }, '3')).toBeGreaterThan(required({}, '3'));
  });

  // Smith, Clark, Pierce & Regli 1995, a regression of the same data; from memory. Made for 5 °C and more.
  it('lies near the published regression', () => {
    const ratios = cells
      .filter((cell) => cell.temperatureC >= 5)
      .map(({ temperatureC, pH, residualMgL, ct }) => {
        const fit = 0.2828 * pH ** 2.69 * residualMgL ** 0.15 * 0.933 ** (temperatureC - 5) * 3;
        return fit / ct;
      });
    const mean = ratios.reduce((sum, ratio) => sum + ratio, 0) / ratios.length;
    expect(Math.abs(mean - 1)).toBeLessThan(0.06);
    expect(Math.max(...ratios.map((ratio) => Math.abs(ratio - 1)))).toBeLessThan(0.25);
  });
});

describe('the other tables (recalled from memory)', () => {
  const rows = [
    [
      'giardia',
      'chlorine-dioxide',
      published.giardia_chlorine_dioxide,
      tables.GIARDIA_CHLORINE_DIOXIDE,
    ],
    ['giardia', 'ozone', published.giardia_ozone, tables.GIARDIA_OZONE],
    ['giardia', 'chloramine', published.giardia_chloramine, tables.GIARDIA_CHLORAMINE],
    ['virus', 'chlorine-dioxide', published.virus_chlorine_dioxide, tables.VIRUS_CHLORINE_DIOXIDE],
    ['virus', 'ozone', published.virus_ozone, tables.VIRUS_OZONE],
    ['virus', 'chloramine', published.virus_chloramine, tables.VIRUS_CHLORAMINE],
    [
      'cryptosporidium',
      'chlorine-dioxide',
      published.cryptosporidium_chlorine_dioxide,
      tables.CRYPTOSPORIDIUM_CHLORINE_DIOXIDE,
    ],
    ['cryptosporidium', 'ozone', published.cryptosporidium_ozone, tables.CRYPTOSPORIDIUM_OZONE],
  ] as const;

  it.each(rows)('%s by %s: every printed cell', (organism, agent, source, table) => {
    let compared = 0;
    for (const [key, printed] of Object.entries(source) as [string, unknown][]) {
      const log = /^([\d.]+)(?:log)?$/.exec(key)?.[1];
      if (log === undefined || !Array.isArray(printed)) continue;
      printed.forEach((ct: number, i) => {
        compared++;
        const temperatureC = table.temperaturesC[i] ?? NaN;
        const done = accepted(disinfect(contact({ organism, agent, temperatureC, ctMgMinL: ct })));
        expect(done.ctRequiredMgMinL[String(Number(log))]).toBe(ct);
        expect(done.logInactivation).toBeCloseTo(Number(log), 9);
      });
    }
    expect(compared).toBe(table.logs.length * table.temperaturesC.length);
  });

  it('has viruses by free chlorine in both columns of pH', () => {
    const source = published.virus_free_chlorine;
    for (const log of [2, 3, 4] as const) {
      const { 'pH6-9': plain, pH10: alkaline } = source[`${log}log`];
      source.temps_C.forEach((temperatureC, i) => {
        const change = { organism: 'virus', temperatureC } as const;
        expect(required({ ...change, pH: 8 }, String(log))).toBe(plain[i]);
        expect(required({ ...change, pH: 10 }, String(log))).toBe(alkaline[i]);
      });
    }
    expect(required({ organism: 'virus', pH: 9.5 }, '4')).toBeCloseTo((6 + 45) / 2, 9);
  });
});

describe('log inactivation', () => {
  it('is nothing without contact and ends at the last row, saying so', () => {
    expect(accepted(disinfect(contact({ ctMgMinL: 0 }))).logInactivation).toBe(0);
    const much = accepted(disinfect(contact({ ctMgMinL: 1000 })));
    expect(much).toMatchObject({ logInactivation: 3, beyondTable: true });
  });

  it('is in proportion for Giardia by chlorine', () => {
    const half = accepted(disinfect(contact({ ctMgMinL: 56 })));
    expect(half.logInactivation).toBeCloseTo(1.5, 9);
  });
});

describe('what the tables do not cover is refused', () => {
  it.each([
    [{ organism: 'cryptosporidium' }, 'agent'],
    [{ organism: 'cholera' as never }, 'organism'],
    [{ agent: 'hope' as never }, 'agent'],
    [{ agent: 'toString' as never }, 'agent'],
    [{ pH: 9.2 }, 'pH'],
    [{ residualMgL: 3.2 }, 'residualMgL'],
    [{ agent: 'chloramine', pH: 5.5 }, 'pH'],
    [{ temperatureC: NaN }, 'temperatureC'],
    [{ ctMgMinL: -1 }, 'ctMgMinL'],
  ] as readonly [Partial<Contact>, string][])('%j', (change, path) => {
    expect(disinfect(contact(change))).toMatchObject({ ok: false, path });
  });
});
