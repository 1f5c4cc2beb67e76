import { serve } from '@/lib/api/serve';
import { listAudit } from '@/lib/public-api/audit';

export const GET = serve(listAudit);
