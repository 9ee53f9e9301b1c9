import { insertAuditEvent } from '@/db/queries/audit';
import { listSeasons } from '@/db/queries/season-view';
import { lockCurrentSeason, setCurrentSeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Makes a season the one that people of the league land in. */
export async function chooseCurrentSeason(
  ctx: ActorContext,
  input: { seasonId: string },
): Promise<{ name: string }> {
  assertCan(ctx.actor, 'season.write');
  return withLeague(ctx.league.id, async (tx) => {
    const before = await lockCurrentSeason(tx);
    const seasons = await listSeasons(tx);
    const season = seasons.find((entry) => entry.id === input.seasonId);
    if (!season) throw notFound('season');
    if (season.id !== before) {
      await setCurrentSeason(tx, season.id);
      const from = seasons.find((entry) => entry.id === before)?.name ?? null;
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        {
          type: 'league changed',
          subjectId: ctx.league.id,
          data: { changes: { currentSeason: { from, to: season.name } } },
        },
      );
    }
    return { name: season.name };
  });
}
