import { insertAuditEvent } from '@/db/queries/audit';
import { deleteTeam, lockTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Removes a team with its roster and players, unless a batch holds the roster. */
export async function removeTeam(
  ctx: ActorContext,
  input: { teamId: string },
): Promise<{ name: string; players: number }> {
  assertCan(ctx.actor, 'team.write');
  return withLeague(ctx.league.id, async (tx) => {
    const team = await lockTeam(tx, input.teamId);
    if (!team) throw notFound('team');
    if (team.batch !== null)
      throw new AppError(
        'conflict',
        `Batch ${team.batch} holds the roster of ${team.name}, so the team stays.`,
      );
    if (team.state === 'signed off' || team.state === 'frozen') {
      throw new AppError(
        'locked',
        `The roster of ${team.name} is ${team.state}. Reopen it before the team is removed.`,
      );
    }
    await deleteTeam(tx, team.id);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'team removed', subjectId: team.id, data: { name: team.name, players: team.players } },
    );
    return { name: team.name, players: team.players };
  });
}
