import { pingDatabase } from '@/lib/health';

export const dynamic = 'force-dynamic';

/** 200 when the process answers and its database does; the scripts wait for it. */
export async function GET(): Promise<Response> {
  const database = await pingDatabase();
  return Response.json({ ok: database }, { status: database ? 200 : 503 });
}
