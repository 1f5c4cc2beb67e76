import * as z from 'zod';

/** What the public API hands out. A field that does not stand here does not leave the product. */
const moment = z.iso.datetime().meta({ description: 'UTC.' });
const bound = z.number().nullable();

export const plantAnswer = z
  .object({
    id: z.string(),
    slug: z.string(),
    name: z.string(),
    sourceSummary: z.string(),
    timeZone: z.string().meta({ description: 'IANA name; local times are told in it.' }),
    designFlowMlPerD: z.number(),
  })
  .meta({ id: 'Plant' });

export const targetAnswer = z
  .object({
    id: z.string(),
    version: z.int(),
    pointId: z.string(),
    quantity: z.string(),
    lowest: bound,
    highest: bound,
    preferred: bound,
    basis: z.string(),
  })
  .meta({ id: 'Target', description: 'Bounds in the quantity’s canonical unit.' });

export const pointAnswer = z
  .object({
    id: z.string(),
    slug: z.string(),
    name: z.string(),
    kind: z.enum(['raw', 'clarified', 'filtered', 'finished', 'network']),
    sampleEveryH: z.number().nullable(),
    quantities: z.array(
      z.object({
        quantity: z.string(),
        unit: z.string(),
        decimals: z.int(),
        usualLow: bound,
        usualHigh: bound,
      }),
    ),
  })
  .meta({ id: 'SamplingPoint' });

const resultAnswer = z.object({
  quantity: z.string(),
  text: z.string().meta({ description: 'As written, figures kept.' }),
  unit: z.string(),
  qualifier: z.enum(['', '<', '>', 'nd', 'e']),
  value: z.number().meta({ description: 'In the quantity’s canonical unit.' }),
});

export const sampleAnswer = z
  .object({
    id: z.string(),
    pointId: z.string(),
    takenAt: moment,
    enteredBy: z.string(),
    results: z.array(resultAnswer),
    indices: z.record(z.string(), z.number()),
  })
  .meta({ id: 'Sample' });

export const wholeSampleAnswer = sampleAnswer
  .extend({
    enteredAt: moment,
    comment: z.string(),
    solution: z
      .object({
        engineVersion: z.string(),
        constantsHash: z.string(),
        assumptions: z.array(z.string()),
        refusal: z.string().nullable(),
      })
      .nullable(),
  })
  .meta({ id: 'WholeSample' });

export const planAnswer = z
  .object({
    id: z.string(),
    sampleId: z.string(),
    pointName: z.string(),
    takenAt: moment,
    status: z.string(),
    targetQuantity: z.string(),
    targetValue: z.number(),
    doses: z.array(z.object({ reagent: z.string(), doseMgL: z.number() })),
    predicted: z.object({
      before: z.record(z.string(), z.number().nullable()),
      equilibrium: z.record(z.string(), z.number().nullable()),
    }),
    engineVersion: z.string(),
    reason: z.string(),
    createdBy: z.string(),
    createdAt: moment,
    cautions: z.array(z.string()),
  })
  .meta({ id: 'Plan', description: 'A draft for the licensed operator in charge, not a setting.' });

export const feedEntryAnswer = z
  .object({
    id: z.string(),
    dosingPointId: z.string(),
    productName: z.string(),
    from: moment,
    to: moment,
    productKg: z.number(),
    waterTreatedMl: z.number().nullable(),
    note: z.string(),
    loggedBy: z.string(),
    loggedAt: moment,
  })
  .meta({ id: 'FeedEntry' });

export const auditAnswer = z
  .object({
    position: z.int(),
    at: moment,
    actorId: z.string(),
    actorName: z.string(),
    action: z.string(),
    subjectId: z.string(),
    detail: z.unknown(),
    previousHash: z.string(),
    hash: z.string(),
  })
  .meta({ id: 'AuditEntry' });

/** The id of what a creating request made, or had made before under the same key. */
export const madeAnswer = z.object({ id: z.string() }).meta({ id: 'Made' });
