import type { LeagueTx } from '../tenant';
import { deleteStoredFile } from './stored-files';

/** The bundle of a batch with its finished files; undefined before the batch is released. */
export async function findBundle(tx: LeagueTx, batchId: string) {
  return tx
    .selectFrom('bundles as z')
    .leftJoin('stored_files as f', (join) =>
      join.onRef('f.league_id', '=', 'z.league_id').onRef('f.id', '=', 'z.zip_file_id'),
    )
    .select([
      'z.id',
      'z.state',
      'z.done',
      'z.total',
      'z.doing',
      'z.failure',
      'z.zip_file_id as zipFileId',
      'f.bytes',
      'f.sha256',
      'z.queued_at as queuedAt',
      'z.finished_at as finishedAt',
    ])
    .where('z.league_id', '=', tx.leagueId)
    .where('z.batch_id', '=', batchId)
    .executeTakeFirst();
}

/** The files of a bundle in their order, each with its size and SHA-256. */
export async function listBundleParts(tx: LeagueTx, bundleId: string) {
  return tx
    .selectFrom('bundle_parts as p')
    .innerJoin('stored_files as f', (join) =>
      join.onRef('f.league_id', '=', 'p.league_id').onRef('f.id', '=', 'p.file_id'),
    )
    .select([
      'p.path',
      'p.label',
      'p.media_type as mediaType',
      'p.position',
      'p.file_id as fileId',
      'f.bytes',
      'f.sha256',
    ])
    .where('p.league_id', '=', tx.leagueId)
    .where('p.bundle_id', '=', bundleId)
    .orderBy('p.position')
    .execute();
}

/** Queues a bundle for a batch that was just released. */
export async function insertBundle(
  tx: LeagueTx,
  bundle: { id: string; batchId: string; now: Date },
): Promise<void> {
  await tx
    .insertInto('bundles')
    .values({
      league_id: tx.leagueId,
      id: bundle.id,
      batch_id: bundle.batchId,
      state: 'queued',
      queued_at: bundle.now,
    })
    .execute();
}

/** Locks the bundle of a batch until the transaction ends; undefined when there is none. */
export function lockBundle(tx: LeagueTx, batchId: string) {
  return tx
    .selectFrom('bundles')
    .select(['id', 'state'])
    .where('league_id', '=', tx.leagueId)
    .where('batch_id', '=', batchId)
    .forUpdate()
    .executeTakeFirst();
}

/** Says how far the build has come. A bundle that is ready stays ready. */
export async function updateBundleProgress(
  tx: LeagueTx,
  bundleId: string,
  progress: { done: number; total: number; doing: string; startedAt?: Date },
): Promise<void> {
  await tx
    .updateTable('bundles')
    .set({
      state: 'building',
      done: progress.done,
      total: progress.total,
      doing: progress.doing,
      failure: null,
      ...(progress.startedAt && { started_at: progress.startedAt }),
    })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', bundleId)
    .where('state', '!=', 'ready')
    .execute();
}

/** Puts a failed or waiting bundle back to the start of the queue, or notes why it failed. */
export async function updateBundleState(
  tx: LeagueTx,
  bundleId: string,
  change:
    | { state: 'queued'; now: Date }
    | { state: 'failed'; failure: string; now: Date }
    | { state: 'ready'; zipFileId: string; now: Date },
): Promise<void> {
  const fields =
    change.state === 'queued'
      ? { failure: null, queued_at: change.now, finished_at: null, done: 0 }
      : change.state === 'failed'
        ? { failure: change.failure, finished_at: change.now }
        : { zip_file_id: change.zipFileId, finished_at: change.now, failure: null, doing: '' };
  await tx
    .updateTable('bundles')
    .set({ state: change.state, ...fields })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', bundleId)
    .where('state', '!=', 'ready')
    .execute();
}

/**
 * Adds a finished file to a bundle. When another worker was faster (the same bytes, since builds are deterministic),
 * the file just stored is dropped and false comes back.
 */
export async function insertBundlePart(
  tx: LeagueTx,
  part: {
    bundleId: string;
    path: string;
    label: string;
    mediaType: string;
    position: number;
    fileId: string;
  },
): Promise<boolean> {
  const result = await tx
    .insertInto('bundle_parts')
    .values({
      league_id: tx.leagueId,
      bundle_id: part.bundleId,
      path: part.path,
      label: part.label,
      media_type: part.mediaType,
      position: part.position,
      file_id: part.fileId,
    })
    .onConflict((conflict) => conflict.columns(['league_id', 'bundle_id', 'path']).doNothing())
    .executeTakeFirst();
  const added = result.numInsertedOrUpdatedRows === 1n;
  if (!added) await deleteStoredFile(tx, part.fileId);
  return added;
}
