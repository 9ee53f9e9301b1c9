import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { saveColumnMapping } from '@/db/queries/column-mappings';
import { writePlayers } from '@/db/queries/players';
import { touchRoster } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import { mergePlayers } from '@/lib/domain/roster/merge-players';
import { listPlayerWrites } from '@/lib/domain/roster/list-player-writes';
import { mostPlayersPerRoster } from '@/lib/domain/roster/player';
import { AppError } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { assertEditable, assertRevision, lockRosterFor } from '../roster-guards';
import type { importRosterSchema } from './roster-schemas';

export type ImportedRoster = { added: number; changed: number; removed: number; unchanged: number };

/**
 * Brings the lines of a file into a roster, all or nothing, as the preview said it would: the plan is made again from
 * the stored players, and refused when they have changed since. The mapping of the columns is kept for the next file.
 */
export async function importRoster(
  ctx: ActorContext,
  input: z.output<typeof importRosterSchema>,
): Promise<ImportedRoster> {
  assertCan(ctx.actor, 'roster.edit');
  return withLeague(ctx.league.id, async (tx) => {
    const { roster, players } = await lockRosterFor(tx, ctx, 'roster.edit', input.rosterId);
    assertEditable(roster);
    assertRevision(roster, input.revision);
    const merged = mergePlayers({
      players,
      lines: input.lines,
      decisions: new Map(input.decisions.map(({ row, decision }) => [row, decision])),
      mode: input.mode,
      newId: ctx.newId,
    });
    if (merged.undecided > 0) {
      throw new AppError(
        'invalid',
        `Say for ${merged.undecided === 1 ? '1 line' : `${merged.undecided} lines`} which player it is, or that it is somebody new.`,
      );
    }
    if (merged.players.length > Math.max(players.length, mostPlayersPerRoster)) {
      throw new AppError(
        'invalid',
        `A roster holds at most ${mostPlayersPerRoster} players, and this would make ${merged.players.length}. Keep the rows of one team.`,
      );
    }
    const by = { now: ctx.now, userId: ctx.actor.userId };
    const writes = listPlayerWrites(players, merged.players);
    if (!(await writePlayers(tx, roster.id, writes, by))) throw new Error('a new id was taken');
    await touchRoster(tx, roster.id, by);
    if (input.remember)
      await saveColumnMapping(tx, { teamId: roster.team.id, now: ctx.now, ...input.remember });
    const counts = {
      added: writes.added.length,
      changed: writes.changed.length,
      removed: writes.removed.length,
    };
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'roster imported',
        subjectId: roster.id,
        data: { team: roster.team.name, ...counts, refused: input.refused },
      },
    );
    return { ...counts, unchanged: merged.unchanged };
  });
}
