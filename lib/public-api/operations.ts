import type { Operation } from '@/lib/api/operation';
import { exportAuditTrail, listAudit } from './audit';
import { createFeedEntry, listFeedLog } from './feed-log';
import { createPlan, listPlans, readPlan } from './plans';
import { listPlants, listPoints, readPlant } from './plants';
import { createSample, listSamples, readSample } from './samples';
import { readSeries } from './series';
import { listTargets, putTarget, readTarget } from './targets';

/** Every operation of the public API, in the order the guide tells them. */
export const OPERATIONS: readonly Operation[] = [
  listPlants,
  readPlant,
  listPoints,
  listTargets,
  readTarget,
  putTarget,
  listSamples,
  readSample,
  createSample,
  listPlans,
  readPlan,
  createPlan,
  listFeedLog,
  createFeedEntry,
  readSeries,
  listAudit,
  exportAuditTrail,
];
