import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import type { Refusal } from '../types';
import * as tables from './ct-tables';
import { placeOn, readAt, type Reading } from './interpolate';

export type Disinfectant = 'chlorine' | 'chloramine' | 'chlorine-dioxide' | 'ozone';
export type Organism = 'giardia' | 'virus' | 'cryptosporidium';

export interface Contact {
  readonly agent: Disinfectant;
  readonly organism: Organism;
  readonly temperatureC: number;
  readonly pH: number;
  /** Residual at the end of the contact, mg/L (chlorine as Cl2). */
  readonly residualMgL: number;
  /** Residual × effective contact time, mg·min/L. */
  readonly ctMgMinL: number;
  /** Between printed values: straight lines, or the nearest printed value on the safe side. */
  readonly reading?: Reading;
}

export type Inactivation =
  | {
      readonly ok: true;
      /** Log inactivation achieved, never more than the table's last row. */
      readonly logInactivation: number;
      /** True when the CT exceeds the table's last row: at least the log given is achieved. */
      readonly beyondTable: boolean;
      /** CT the table asks for, by log inactivation. */
      readonly ctRequiredMgMinL: Readonly<Record<string, number>>;
    }
  | Refusal;

const PH_TABLED = [6, 9] as const;
const VIRUS_CHLORINE_PH = [6, 10] as const;
const HIGHEST_CHLORINE_MG_L = 3;
const GIARDIA_LOGS = [0.5, 1, 1.5, 2, 2.5, 3] as const;

/**
 * Log inactivation by the published CT tables, and the CT they ask for. Colder than the table's first column counts as
 * that column does; warmer than its last is read there. Whatever the tables do not cover is refused.
 */
export function disinfect(contact: Contact): Inactivation {
  const fault =
    checkNumber(contact.temperatureC, 'temperatureC', [0, 50]) ??
    checkNumber(contact.pH, 'pH', [0, 14]) ??
    checkNumber(contact.residualMgL, 'residualMgL', [0, 50]) ??
    checkNumber(contact.ctMgMinL, 'ctMgMinL', [0, 1e7]);
  if (fault) return fault;
  const required = requiredBy(contact);
  if ('ok' in required) return required;
  const { logs, ct } = required;
  const achieved = achievedBy(contact.ctMgMinL, logs, ct);
  const most = logs.at(-1) ?? NaN;
  return {
    ok: true,
    logInactivation: Math.min(achieved, most),
    beyondTable: achieved > most,
    ctRequiredMgMinL: Object.fromEntries(logs.map((log, i) => [String(log), ct[i] ?? NaN])),
  };
}

interface Required {
  readonly logs: readonly number[];
  readonly ct: readonly number[];
}

function requiredBy(contact: Contact): Required | Refusal {
  const { agent, organism, pH } = contact;
  const byLog: Readonly<Record<Organism, Partial<Record<Disinfectant, tables.LogTable>>>> = {
    giardia: {
      'chlorine-dioxide': tables.GIARDIA_CHLORINE_DIOXIDE,
      ozone: tables.GIARDIA_OZONE,
      chloramine: tables.GIARDIA_CHLORAMINE,
    },
    virus: {
      chlorine: tables.VIRUS_CHLORINE,
      'chlorine-dioxide': tables.VIRUS_CHLORINE_DIOXIDE,
      ozone: tables.VIRUS_OZONE,
      chloramine: tables.VIRUS_CHLORAMINE,
    },
    cryptosporidium: {
      'chlorine-dioxide': tables.CRYPTOSPORIDIUM_CHLORINE_DIOXIDE,
      ozone: tables.CRYPTOSPORIDIUM_OZONE,
    },
  };
  if (!Object.hasOwn(byLog, organism)) {
    return refuse('badInput', `No organism is called ${String(organism)}.`, 'organism');
  }
  if (organism === 'giardia' && agent === 'chlorine') return giardiaByChlorine(contact);
  const ofOrganism = byLog[organism];
  const table = Object.hasOwn(ofOrganism, agent) ? ofOrganism[agent] : undefined;
  if (table === undefined) {
    return refuse('badInput', `No table gives ${organism} by ${String(agent)}.`, 'agent');
  }
  if (organism === 'virus' && agent === 'chlorine') return virusByChlorine(contact);
  // Ozone's and Cryptosporidium's tables do not depend on pH; the others are printed for pH 6 to 9.
  const anyPH = agent === 'ozone' || organism === 'cryptosporidium';
  const fault = anyPH ? undefined : checkNumber(pH, 'pH', PH_TABLED);
  return fault ?? byTemperature(table, contact);
}

function byTemperature(table: tables.LogTable, contact: Contact): Required {
  const place = placeOn(
    table.temperaturesC,
    contact.temperatureC,
    contact.reading ?? 'interpolated',
    'lower',
  );
  return { logs: table.logs, ct: table.ct.map((row) => readAt(place, (i) => row[i] ?? NaN)) };
}

/** Printed for 3 log; other logs are their share of it, as the guidance manual's tables are. */
function giardiaByChlorine(contact: Contact): Required | Refusal {
  const { temperaturesC, residualsMgL, pH: axis, threeLog } = tables.GIARDIA_CHLORINE;
  const fault =
    checkNumber(contact.pH, 'pH', [0, PH_TABLED[1]]) ??
    checkNumber(contact.residualMgL, 'residualMgL', [0, HIGHEST_CHLORINE_MG_L]);
  if (fault) return fault;
  const reading = contact.reading ?? 'interpolated';
  const temperature = placeOn(temperaturesC, contact.temperatureC, reading, 'lower');
  const residual = placeOn(residualsMgL, contact.residualMgL, reading, 'higher');
  const acidity = placeOn(axis, contact.pH, reading, 'higher');
  const three = readAt(temperature, (t) =>
    readAt(residual, (r) => readAt(acidity, (p) => threeLog[t]?.[r]?.[p] ?? NaN)),
  );
  return { logs: GIARDIA_LOGS, ct: GIARDIA_LOGS.map((log) => (three * log) / 3) };
}

function virusByChlorine(contact: Contact): Required | Refusal {
  const fault = checkNumber(contact.pH, 'pH', VIRUS_CHLORINE_PH);
  if (fault) return fault;
  const place = placeOn([9, 10], contact.pH, contact.reading ?? 'interpolated', 'higher');
  const low = byTemperature(tables.VIRUS_CHLORINE, contact);
  const high = byTemperature(tables.VIRUS_CHLORINE_PH_10, contact);
  const ct = low.ct.map((value, i) =>
    readAt(place, (at) => (at === 0 ? value : (high.ct[i] ?? NaN))),
  );
  return { logs: low.logs, ct };
}

/** Log inactivation on the broken line through nothing and the table's rows, carried on beyond the last. */
function achievedBy(given: number, logs: readonly number[], ct: readonly number[]): number {
  const xs = [0, ...ct];
  const ys = [0, ...logs];
  let i = xs.findIndex((x) => x >= given);
  if (i < 0) i = xs.length - 1;
  if (i === 0) return 0;
  const [x0 = NaN, x1 = NaN] = [xs[i - 1], xs[i]];
  const [y0 = NaN, y1 = NaN] = [ys[i - 1], ys[i]];
  return x1 === x0 ? y1 : y0 + ((given - x0) / (x1 - x0)) * (y1 - y0);
}
