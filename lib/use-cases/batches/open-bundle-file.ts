import { hasAuditEventSince, insertAuditEvent } from '@/db/queries/audit';
import { findBundle, listBundleParts } from '@/db/queries/bundles';
import { readStoredFile } from '@/db/queries/stored-files';
import { withLeague } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';
import { findVisibleBatch } from '../batch-guards';
import type { ActorContext } from '../context';

/** A file ready to be streamed; `read` gives the bytes from `start` to `end`, both included. */
export type OpenFile = {
  name: string;
  mediaType: string;
  bytes: number;
  sha256: string;
  read: (range: { start: number; end: number }) => AsyncGenerator<Uint8Array>;
};

const oneDayMs = 24 * 60 * 60 * 1000;

/**
 * Opens the ZIP of a batch (`path` null) or one of its files. Notes in the history who took what, once per download
 * and not for each further range.
 */
export async function openBundleFile(
  ctx: ActorContext,
  input: { code: string; path: string | null; isFirstRange: boolean },
): Promise<OpenFile> {
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await findVisibleBatch(tx, ctx, input.code);
    const bundle = await findBundle(tx, batch.id);
    if (!bundle || bundle.state !== 'ready' || bundle.zipFileId === null) {
      throw new AppError(
        'conflict',
        `The bundle of batch ${batch.code} is not ready yet. Its page shows how far it is.`,
      );
    }
    const file =
      input.path === null
        ? {
            path: `${ctx.league.slug}-${batch.code.toLowerCase()}.zip`,
            mediaType: 'application/zip',
            fileId: bundle.zipFileId,
            bytes: bundle.bytes ?? 0,
            sha256: bundle.sha256 ?? '',
          }
        : (await listBundleParts(tx, bundle.id)).find((part) => part.path === input.path);
    if (!file) throw notFound('file');
    const event = {
      type: 'bundle downloaded' as const,
      subjectId: batch.id,
      data: { code: batch.code, file: file.path },
    };
    const { userId } = ctx.actor;
    const since = new Date(ctx.now.getTime() - oneDayMs);
    // A further piece belongs to the download noted before it; without one it is a download of its own.
    if (input.isFirstRange || !(await hasAuditEventSince(tx, { event, userId, since }))) {
      await insertAuditEvent(tx, { ...ctx, userId }, event);
    }
    return {
      name: file.path.split('/').at(-1) ?? file.path,
      mediaType: file.mediaType,
      bytes: file.bytes,
      sha256: file.sha256,
      read: (range) => readStoredFile(ctx.league.id, file.fileId, range),
    };
  });
}
