import { readUpload, type UploadResult } from '@/lib/platform/files/read-upload';
import { assertCan, type ActorContext } from '../context';

/** Reads a file for the preview of an import of teams: its sheets and rows, or why it is refused. Nothing is stored. */
export async function readTeamFile(
  ctx: ActorContext,
  input: { name: string; bytes: Uint8Array },
): Promise<UploadResult> {
  assertCan(ctx.actor, 'team.write');
  return readUpload(input);
}
