// For whoever restarts processes: the process is up. It asks nothing of the database, so that a database that is down
// does not get every web process killed as well.
export function GET(): Response {
  return Response.json({ status: 'ok' }, { headers: { 'cache-control': 'no-store' } });
}

export const dynamic = 'force-dynamic';
