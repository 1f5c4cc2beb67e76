import { serve } from '@/lib/api/serve';
import { listPoints } from '@/lib/public-api/plants';

export const GET = serve(listPoints);
