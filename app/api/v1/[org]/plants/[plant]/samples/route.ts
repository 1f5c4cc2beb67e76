import { serve } from '@/lib/api/serve';
import { createSample, listSamples } from '@/lib/public-api/samples';

export const GET = serve(listSamples);
export const POST = serve(createSample);
