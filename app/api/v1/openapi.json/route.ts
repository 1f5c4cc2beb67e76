import { openApiDocument } from '@/lib/public-api/open-api';

/** The document for machines; the guide at /api-guide tells the same to people. */
export const GET = (): Response => Response.json(openApiDocument());
