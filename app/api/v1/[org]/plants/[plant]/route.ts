import { serve } from '@/lib/api/serve';
import { readPlant } from '@/lib/public-api/plants';

export const GET = serve(readPlant);
