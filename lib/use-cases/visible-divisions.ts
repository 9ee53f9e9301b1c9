import { listDivisionIdsOfTeams } from '@/db/queries/divisions';
import type { LeagueTx } from '@/db/tenant';
import { canForWholeLeague, type Permission } from '@/lib/domain/access/permissions';
import type { ActorContext } from './context';

/** The divisions a person may see by a permission that reaches only as far as their own teams; null means all of them. */
export async function findVisibleDivisions(
  tx: LeagueTx,
  ctx: ActorContext,
  permission: Permission,
): Promise<ReadonlySet<string> | null> {
  if (canForWholeLeague(ctx.actor, permission)) return null;
  return listDivisionIdsOfTeams(tx, ctx.actor.teamIds);
}
