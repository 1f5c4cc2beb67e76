'use server';

import { memberAction } from '@/lib/auth/member-action';
import { savePlan } from '@/lib/plans/save-plan';
import { planInput } from '@/lib/plans/schema';

export const savePlanAction = memberAction('plan.write', planInput, savePlan);
