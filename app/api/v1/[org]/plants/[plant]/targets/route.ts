import { serve } from '@/lib/api/serve';
import { listTargets } from '@/lib/public-api/targets';

export const GET = serve(listTargets);
