'use server';

import { memberAction } from '@/lib/auth/member-action';
import { saveSample } from '@/lib/samples/save-sample';
import { sampleInput } from '@/lib/samples/schema';

export const saveSampleAction = memberAction('sample.write', sampleInput, (actor, input) =>
  saveSample(actor, input),
);
