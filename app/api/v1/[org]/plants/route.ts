import { serve } from '@/lib/api/serve';
import { listPlants } from '@/lib/public-api/plants';

export const GET = serve(listPlants);
