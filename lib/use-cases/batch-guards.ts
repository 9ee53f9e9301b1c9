import { findBatch, listShops, lockBatch, lockRostersOfTeams, type BatchRow } from '@/db/queries/batches';
import { listTeamViews, type TeamView } from '@/db/queries/team-view';
import type { LeagueTx } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from './context';

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

/** Locks a batch that must still be held; a released one is `locked`. */
export async function lockHeldBatch(tx: LeagueTx, batchId: string): Promise<BatchRow> {
  const batch = await lockBatch(tx, batchId);
  if (!batch) throw notFound('batch');
  if (batch.state !== 'held') {
    throw new AppError(
      'locked',
      `Batch ${batch.code} is ${batch.state}. What a shop has been given no longer changes.`,
    );
  }
  return batch;
}

/**
 * The batch with this code, for those who may see it: the league, or the decorators of its shop once it is released.
 * To everybody else it does not exist.
 */
export async function findVisibleBatch(tx: LeagueTx, ctx: ActorContext, code: string): Promise<BatchRow> {
  const batch = await findBatch(tx, code);
  if (!batch) throw notFound('batch');
  if (can(ctx.actor, 'batch.make')) return batch;
  assertCan(ctx.actor, 'batch.read', { shopId: batch.shop.id, what: 'batch' });
  if (batch.state === 'held') throw notFound('batch');
  return batch;
}
