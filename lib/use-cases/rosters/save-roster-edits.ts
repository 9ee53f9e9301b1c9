import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listPlayers, writePlayers, type StoredEntry } from '@/db/queries/players';
import { touchRoster } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import type { RosterChange } from '@/lib/domain/audit/event';
import { applyEdits, type EditConflict } from '@/lib/domain/roster/apply-edits';
import { toRosterEntry, type RosterEdit, type RosterEntry } from '@/lib/domain/roster/edit';
import { foldEdits } from '@/lib/domain/roster/fold-edits';
import { listPlayerWrites } from '@/lib/domain/roster/list-player-writes';
import { mostPlayersPerRoster } from '@/lib/domain/roster/player';
import { AppError } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { assertEditable, lockRosterFor } from '../roster-guards';
import type { saveRosterEditsSchema } from './roster-schemas';

export type SavedEdits = {
  revision: number;
  players: Omit<StoredEntry, 'position'>[];
  conflicts: EditConflict[];
  savedAt: Date;
};

/**
 * Saves edits cell by cell against the roster as it is now, whatever revision they were made on: what another person
 * changed elsewhere stays, what both changed comes back as a conflict with both values, and edits sent twice are done
 * once.
 */
export async function saveRosterEdits(
  ctx: ActorContext,
  input: z.output<typeof saveRosterEditsSchema>,
): Promise<SavedEdits> {
  assertCan(ctx.actor, 'roster.edit');
  return withLeague(ctx.league.id, async (tx) => {
    const { roster, players } = await lockRosterFor(tx, ctx, 'roster.edit', input.rosterId);
    assertEditable(roster);
    const before: RosterEntry[] = players.map(toRosterEntry);
    const outcome = applyEdits(before, foldEdits(input.edits));
    if (outcome.players.length > Math.max(before.length, mostPlayersPerRoster)) {
      throw new AppError(
        'invalid',
        `A roster holds at most ${mostPlayersPerRoster} players, and this would make ${outcome.players.length}. Take some out again.`,
      );
    }
    if (outcome.applied.length === 0) {
      return answer(roster.revision, players, outcome.conflicts, roster.updated.at);
    }
    const by = { now: ctx.now, userId: ctx.actor.userId };
    if (!(await writePlayers(tx, roster.id, listPlayerWrites(players, outcome.players), by))) {
      throw new AppError('conflict', 'A player with this id is in another roster. Read the page again.');
    }
    const revision = await touchRoster(tx, roster.id, by);
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'roster edited',
        subjectId: roster.id,
        data: { team: roster.team.name, changes: outcome.applied.map(toChange) },
      },
    );
    return answer(revision, await listPlayers(tx, roster.id), outcome.conflicts, ctx.now);
  });
}

const answer = (
  revision: number,
  players: readonly StoredEntry[],
  conflicts: EditConflict[],
  savedAt: Date,
): SavedEdits => ({
  revision,
  players: players.map(({ position: _, ...player }) => player),
  conflicts,
  savedAt,
});

function toChange(edit: RosterEdit): RosterChange {
  switch (edit.kind) {
    case 'set':
      return { kind: 'cell', playerId: edit.playerId, field: edit.field, from: edit.from, to: edit.to };
    case 'add':
      return { kind: 'added', playerId: edit.player.id };
    case 'remove':
      return { kind: 'removed', playerId: edit.was.id, was: edit.was.name };
    case 'move':
      return { kind: 'moved', playerId: edit.playerId };
  }
}
