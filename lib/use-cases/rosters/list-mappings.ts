import { listColumnMappings } from '@/db/queries/column-mappings';
import { findRoster } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** The column mappings kept for a team, by the signature of the headings each was made for. */
export async function listMappings(ctx: ActorContext, input: { rosterId: string }) {
  assertCan(ctx.actor, 'roster.edit');
  return withLeague(ctx.league.id, async (tx) => {
    const roster = await findRoster(tx, input.rosterId);
    if (!roster) throw notFound('roster');
    assertCan(ctx.actor, 'roster.edit', { teamId: roster.team.id, what: 'roster' });
    return listColumnMappings(tx, roster.team.id);
  });
}
export type KeptMapping = Awaited<ReturnType<typeof listMappings>>[number];
