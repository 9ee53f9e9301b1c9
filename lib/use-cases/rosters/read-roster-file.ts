import { findRoster } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import { readUpload, type UploadResult } from '@/lib/platform/files/read-upload';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** Reads a file for the preview of an import: its sheets and rows, or why it is refused. Nothing is stored. */
export async function readRosterFile(
  ctx: ActorContext,
  input: { rosterId: string; name: string; bytes: Uint8Array },
): Promise<UploadResult> {
  assertCan(ctx.actor, 'roster.edit');
  const roster = await withLeague(ctx.league.id, (tx) => findRoster(tx, input.rosterId));
  if (!roster) throw notFound('roster');
  assertCan(ctx.actor, 'roster.edit', { teamId: roster.team.id, what: 'roster' });
  // Outside the transaction: taking a workbook apart may last, and needs no connection.
  return readUpload({ bytes: input.bytes, name: input.name });
}
