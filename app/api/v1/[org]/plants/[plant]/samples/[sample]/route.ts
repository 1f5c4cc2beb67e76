import { serve } from '@/lib/api/serve';
import { readSample } from '@/lib/public-api/samples';

export const GET = serve(readSample);
