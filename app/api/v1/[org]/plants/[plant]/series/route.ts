import { serve } from '@/lib/api/serve';
import { readSeries } from '@/lib/public-api/series';

export const GET = serve(readSeries);
