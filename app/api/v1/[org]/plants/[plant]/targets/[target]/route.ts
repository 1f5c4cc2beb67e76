import { serve } from '@/lib/api/serve';
import { putTarget, readTarget } from '@/lib/public-api/targets';

export const GET = serve(readTarget);
export const PUT = serve(putTarget);
