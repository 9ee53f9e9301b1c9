import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertBatch, listShops, lockRostersOfTeams, replaceBatchRosters } from '@/db/queries/batches';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listTeamViews, type TeamView } from '@/db/queries/team-view';
import { withLeague, type LeagueTx } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { holdBatchSchema } from './batch-schemas';

/** Makes a held batch of signed-off teams for one shop and answers its code. */
export async function holdBatch(
  ctx: ActorContext,
  input: z.output<typeof holdBatchSchema>,
): Promise<{ code: string }> {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    await assertShop(tx, input.shopId);
    const teams = await pickReadyTeams(tx, season.id, input.teamIds, null);
    const id = ctx.newId();
    const code = await insertBatch(tx, {
      id,
      seasonId: season.id,
      shopId: input.shopId,
      promisedOn: input.promisedOn,
      now: ctx.now,
      userId: ctx.actor.userId,
    });
    await replaceBatchRosters(
      tx,
      id,
      teams.map((team) => team.roster.id),
    );
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'batch held', subjectId: id, data: { code, teams: teams.length } },
    );
    return { code };
  });
}

/** Ends the use case unless the shop belongs to this league. */
export async function assertShop(tx: LeagueTx, shopId: string): Promise<void> {
  const shops = await listShops(tx);
  if (!shops.some((shop) => shop.id === shopId)) throw notFound('shop');
}

/**
 * The asked-for teams with their rosters locked, each signed off or frozen and held by no other batch than `batchId`;
 * otherwise one error that names every team that is not ready and why.
 */
export async function pickReadyTeams(
  tx: LeagueTx,
  seasonId: string,
  teamIds: readonly string[],
  batchId: string | null,
): Promise<TeamView[]> {
  // Locked before they are read, so that a sign-off taken back at this moment is either seen or has to wait.
  await lockRostersOfTeams(tx, teamIds);
  const teams = (await listTeamViews(tx, seasonId, teamIds)).filter((team) => teamIds.includes(team.id));
  if (teams.length !== new Set(teamIds).size) throw notFound('team');
  const problems = teams.flatMap((team) => {
    if (team.batch !== null && team.batch.id !== batchId)
      return [`${team.name} is already in batch ${team.batch.code}`];
    if (team.roster.state !== 'signed off' && team.roster.state !== 'frozen')
      return [`${team.name} is ${team.roster.state}, not signed off`];
    return [];
  });
  if (problems.length > 0)
    throw new AppError(
      'conflict',
      `${problems.join('; ')}. Take ${problems.length === 1 ? 'it' : 'them'} out and try again.`,
    );
  return teams;
}
