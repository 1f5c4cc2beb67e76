import { serve } from '@/lib/api/serve';
import { exportAuditTrail } from '@/lib/public-api/audit';

export const GET = serve(exportAuditTrail);
