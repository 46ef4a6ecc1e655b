import { database } from '@/lib/node/database';
import { readHealth } from '@/lib/node/health';
import { log } from '@/lib/node/log';

export const dynamic = 'force-dynamic';

const noStore = { 'Cache-Control': 'no-store' };

/** `/api/health`: 200 when ready, 503 when not. `/api/health?live`: 200 as long as the process answers. */
export async function GET(request: Request): Promise<Response> {
  if (new URL(request.url).searchParams.has('live')) return Response.json({ live: true }, { headers: noStore });
  const health = await readHealth(database, (error) => log.warn({ err: error }, 'the database does not answer'));
  return Response.json(health, { status: health.ready ? 200 : 503, headers: noStore });
}
