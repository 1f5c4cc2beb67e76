import { serve } from '@/lib/api/serve';
import { createPlan, listPlans } from '@/lib/public-api/plans';

export const GET = serve(listPlans);
export const POST = serve(createPlan);
