import { checkReady } from '@/lib/use-cases/health/check-ready';

// For whoever sends requests here: 200 when this process can serve them, 503 naming the part that can't.
export async function GET(): Promise<Response> {
  const { ready, parts } = await checkReady();
  return Response.json(
    { status: ready ? 'ready' : 'not ready', parts },
    { status: ready ? 200 : 503, headers: { 'cache-control': 'no-store' } },
  );
}

export const dynamic = 'force-dynamic';
