'use server';

import { memberAction } from '@/lib/auth/member-action';
import { changeTarget } from '@/lib/targets/change-target';
import { changeTargetInput } from '@/lib/targets/schema';

export const changeTargetAction = memberAction('target.write', changeTargetInput, changeTarget);
