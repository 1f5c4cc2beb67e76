import { disinfect, type Contact } from '../disinfection/disinfect';
import { solveReactions } from '../ledger/reaction-set';
import { doseForTarget } from '../planning/dose-for-target';
import { planDoses } from '../planning/plan';
import type { PlanRequest } from '../planning/plan-types';
import { refuse } from '../refusal';
import { equilibrateWith } from '../solids/equilibrate-with';
import { solveWater } from '../speciation/solve-water';
import { applyDoses } from '../steps/dose';
import type { DoseTarget, ReagentKey, Refusal, Water } from '../types';
import { describeWater } from './describe-water';
import { asWritten } from './paths';
import { isJson, isRefusal, readDoses, readList, readSolids, readWater, type Json } from './read';

type Verb = (request: Json) => Json | Refusal;

/** What the batch entry can be asked. */
export const VERBS = {
  speciate(request) {
    const water = waterOf(request);
    if (isRefusal(water)) return water;
    const solids = readSolids(request);
    if (solids === undefined) return describeWater(water);
    if (isRefusal(solids)) return solids;
    const rest = equilibrateWith(water, solids);
    if (rest.ok) return describeWater(rest.water);
    return { ...rest, path: (rest.path ?? '').replace(/^solids/, 'equilibrateWith') };
  },

  dose(request) {
    const water = waterOf(request);
    if (isRefusal(water)) return water;
    const doses = readDoses(request);
    if (isRefusal(doses)) return doses;
    const { solids } = request;
    if (solids !== undefined && solids !== 'equilibrium' && solids !== 'complete') {
      return refuse('badInput', 'Solids are "complete" or "equilibrium".', 'solids');
    }
    const applied = applyDoses(water, doses, solids === undefined ? {} : { solids });
    return applied.ok ? { steps: applied.waters.map(describeWater) } : asWritten(applied, 'doses');
  },

  target(request) {
    const water = waterOf(request);
    if (isRefusal(water)) return water;
    const target = request['target'];
    const pairs = isJson(target) ? Object.entries(target) : [];
    const [pair] = pairs;
    if (pair === undefined || pairs.length !== 1) {
      return refuse('badInput', 'A target is one quantity with its value.', 'target');
    }
    const [quantity, value] = pair;
    const { reagent, max } = request;
    const found = doseForTarget(
      water,
      reagent as ReagentKey,
      { quantity, value } as DoseTarget,
      max === undefined ? {} : { maxDoseMgL: max as number },
    );
    if (found.ok) return { doses: found.doses.map(({ doseMgL }) => doseMgL) };
    if (found.reason === 'targetUnreachable' && 'reachable' in found) {
      return { doses: [], reachable: found.reachable, message: found.message };
    }
    const path = (found.path ?? '').startsWith('target')
      ? `target.${quantity}`
      : (found.path ?? '');
    return asWritten({ ...found, path }, '');
  },

  plan(request) {
    const water = waterOf(request);
    if (isRefusal(water)) return water;
    const reagents = readList(request, 'reagents');
    if (isRefusal(reagents)) return reagents;
    const targets = readList(request, 'targets');
    if (isRefusal(targets)) return targets;
    const asked = {
      targets,
      reagents: reagents.map((entry) => {
        if (!isJson(entry)) return entry;
        const { reagent, min, max, costPerKg } = entry;
        return {
          reagent,
          maxDoseMgL: max,
          costPerKg,
          ...(min === undefined ? {} : { minDoseMgL: min }),
        };
      }),
    } as PlanRequest;
    const plan = planDoses(water, asked);
    if (!plan.ok) return asWritten(plan, '');
    const [violation] = plan.violations;
    return {
      feasible: plan.feasible,
      doses: plan.doses.map(({ reagent, doseMgL }) => ({ reagent, dose: doseMgL })),
      cost: plan.costPerML,
      binding: plan.binding.map(({ quantity, bound, costPerUnit }) => ({
        quantity,
        bound,
        costPerUnit,
      })),
      ...(violation ? { violation, violations: plan.violations } : {}),
    };
  },

  ledger(request) {
    const solved = solveReactions(
      request['reactions'] as Parameters<typeof solveReactions>[0],
      request['initial'] as Parameters<typeof solveReactions>[1],
    );
    if (!solved.ok) return solved;
    return {
      extents: solved.extents,
      rows: solved.rows.map(({ key, before, change, equilibrium }) => ({
        species: key,
        initial: before,
        change,
        equilibrium,
      })),
      quotients: solved.quotients,
    };
  },

  disinfect(request) {
    const { agent, organism, temperature, pH, residual, ct, reading } = request;
    if (reading !== undefined && reading !== 'interpolated' && reading !== 'conservative') {
      return refuse('badInput', 'Read "interpolated" or "conservative".', 'reading');
    }
    const contact = { agent, organism, temperatureC: temperature, pH, reading };
    const done = disinfect({ ...contact, residualMgL: residual, ctMgMinL: ct } as Contact);
    if (!done.ok) return asWritten(done, '');
    const { logInactivation, beyondTable, ctRequiredMgMinL: ctRequired } = done;
    return { logInactivation, ...(beyondTable ? { beyondTable } : {}), ctRequired };
  },
} as const satisfies Readonly<Record<string, Verb>>;

export const isVerb = (name: string): name is keyof typeof VERBS => Object.hasOwn(VERBS, name);

function waterOf(request: Json): Water | Refusal {
  const analysis = readWater(request);
  if (isRefusal(analysis)) return analysis;
  const solved = solveWater(analysis);
  return solved.ok ? solved.water : asWritten(solved, 'water');
}
