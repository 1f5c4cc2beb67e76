import { serve } from '@/lib/api/serve';
import { createFeedEntry, listFeedLog } from '@/lib/public-api/feed-log';

export const GET = serve(listFeedLog);
export const POST = serve(createFeedEntry);
