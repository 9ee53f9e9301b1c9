import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { toDay } from '@/lib/domain/dates/zone';
import { assertCan, type ActorContext } from '../context';
import { readReadiness } from '../readiness-reading';

/** Where every team of a season stands, and what the person looking may do about it. */
export async function listReadiness(ctx: ActorContext, input: { season: string }) {
  assertCan(ctx.actor, 'readiness.read');
  const { season, teams } = await withLeague(ctx.league.id, (tx) => readReadiness(tx, ctx, input.season));
  return {
    season,
    teams,
    today: toDay(ctx.now, ctx.league.timeZone),
    may: { remind: can(ctx.actor, 'readiness.remind'), batch: can(ctx.actor, 'batch.make') },
  };
}
export type ReadinessList = Awaited<ReturnType<typeof listReadiness>>;
export type ReadyTeam = ReadinessList['teams'][number];
