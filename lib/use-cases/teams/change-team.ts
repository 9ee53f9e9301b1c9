import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listDivisionViews } from '@/db/queries/division-view';
import { listTeamViews } from '@/db/queries/team-view';
import { lockSeasonOfTeam, lockTeam, updateTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { assertTeamFits } from '../team-guards';
import type { changeTeamSchema } from './team-schemas';

/**
 * Changes a team's name, division or colours. A team whose roster is signed off, frozen or in a batch stays in its
 * division: it was checked against that one's rules.
 */
export async function changeTeam(
  ctx: ActorContext,
  input: z.output<typeof changeTeamSchema>,
): Promise<{ rowVersion: number }> {
  assertCan(ctx.actor, 'team.write');
  return withLeague(ctx.league.id, async (tx) => {
    await lockSeasonOfTeam(tx, input.teamId);
    const locked = await lockTeam(tx, input.teamId);
    if (!locked) throw notFound('team');
    const teams = await listTeamViews(tx, locked.seasonId, null);
    const before = teams.find((team) => team.id === locked.id);
    if (!before) throw notFound('team');
    assertTeamFits(
      input.fields,
      { divisions: await listDivisionViews(tx, locked.seasonId), teams },
      locked.id,
    );
    const held = locked.batch !== null ? `is in batch ${locked.batch}` : `is ${locked.state}`;
    const sealed = locked.batch !== null || locked.state === 'signed off' || locked.state === 'frozen';
    if (sealed && input.fields.divisionId !== before.divisionId) {
      const message = `The roster of ${before.name} ${held}, so it stays in its division. Reopen the roster first.`;
      throw new AppError('locked', message, { fields: { 'fields.divisionId': message } });
    }
    if (!(await updateTeam(tx, { ...input.fields, id: locked.id, rowVersion: input.rowVersion }))) {
      throw new AppError(
        'conflict',
        'Somebody changed this team since you opened it. Your entries are kept here; reload to see theirs.',
      );
    }
    const { name, divisionId, kits } = before;
    const changes = listDifferences({ name, divisionId, kits }, input.fields);
    if (changes) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        { type: 'team changed', subjectId: locked.id, data: { name: input.fields.name, changes } },
      );
    }
    return { rowVersion: input.rowVersion + 1 };
  });
}
