import { insertAuditEvent } from '@/db/queries/audit';
import { countTeams, deleteDivision, lockDivision, lockSeasonOfDivision } from '@/db/queries/divisions';
import { withLeague } from '@/db/tenant';
import { countOf } from '@/lib/domain/text/count-of';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Removes a division that has no teams. */
export async function removeDivision(
  ctx: ActorContext,
  input: { divisionId: string },
): Promise<{ name: string }> {
  assertCan(ctx.actor, 'division.write');
  return withLeague(ctx.league.id, async (tx) => {
    await lockSeasonOfDivision(tx, input.divisionId);
    const division = await lockDivision(tx, input.divisionId);
    if (!division) throw notFound('division');
    const teams = await countTeams(tx, division.id);
    if (teams > 0) {
      throw new AppError(
        'conflict',
        `${division.name} has ${countOf(teams, 'team')}. Move or remove ${teams === 1 ? 'it' : 'them'} first.`,
      );
    }
    await deleteDivision(tx, division.id);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'division removed', subjectId: division.id, data: { name: division.name } },
    );
    return { name: division.name };
  });
}
