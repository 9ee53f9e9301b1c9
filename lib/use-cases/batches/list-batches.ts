import { listBatches as readBatches, listShops } from '@/db/queries/batches';
import { listDivisionViews } from '@/db/queries/division-view';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listPlayersByRoster, listTeamViews } from '@/db/queries/team-view';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** The batches of a season, newest first. A decorator sees released ones on the shop pages instead. */
export async function listBatches(ctx: ActorContext, input: { season: string }) {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const batches = await readBatches(tx, season.id);
    const teams = await listTeamViews(tx, season.id, null);
    const ready = teams.filter((team) => isReady(team.roster.state) && team.batch === null).length;
    return { season, batches, ready };
  });
}

const isReady = (state: string): boolean => state === 'signed off' || state === 'frozen';

/**
 * What the form for a batch offers: every team of the season that is signed off and in no batch (or in `batchId`),
 * with its players counted, the shops of the league, and how many teams are not ready yet.
 */
export async function getBatchOptions(ctx: ActorContext, input: { season: string; batchId: string | null }) {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const divisions = new Map(
      (await listDivisionViews(tx, season.id)).map((division) => [division.id, division]),
    );
    const teams = await listTeamViews(tx, season.id, null);
    const offered = teams.filter(
      (team) => isReady(team.roster.state) && (team.batch === null || team.batch.id === input.batchId),
    );
    const players = await listPlayersByRoster(
      tx,
      offered.map((team) => team.roster.id),
    );
    return {
      season: {
        slug: season.slug,
        name: season.name,
        releaseOn: season.releaseOn,
        handOutOn: season.handOutOn,
      },
      shops: await listShops(tx),
      notReady: teams.filter((team) => !isReady(team.roster.state)).length,
      teams: offered.map((team) => ({
        id: team.id,
        name: team.name,
        kit: team.kits.home,
        division: divisions.get(team.divisionId)?.name ?? '',
        players: players.get(team.roster.id)?.length ?? 0,
        state: team.roster.state,
      })),
    };
  });
}
export type BatchOptions = Awaited<ReturnType<typeof getBatchOptions>>;
