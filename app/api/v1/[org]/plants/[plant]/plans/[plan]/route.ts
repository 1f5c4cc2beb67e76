import { serve } from '@/lib/api/serve';
import { readPlan } from '@/lib/public-api/plans';

export const GET = serve(readPlan);
