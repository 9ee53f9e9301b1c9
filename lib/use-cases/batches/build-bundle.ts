import { insertAuditEvent } from '@/db/queries/audit';
import { findSnapshot, findBatchById } from '@/db/queries/batches';
import {
  findBundle,
  insertBundlePart,
  listBundleParts as listStoredParts,
  lockBundle,
  updateBundleProgress,
  updateBundleState,
} from '@/db/queries/bundles';
import { insertStoredFile, readStoredFile } from '@/db/queries/stored-files';
import { withLeague } from '@/db/tenant';
import { listBundleParts } from '@/lib/documents/bundle';
import { buildManifest } from '@/lib/documents/bundle-manifest';
import { zipBundle } from '@/lib/documents/bundle-zip';
import type { RequestContext } from '../context';

/** How often progress is written at most, in parts of a document: a row for every label would be all the work. */
const reportEvery = 8;

/**
 * Builds the bundle of a released batch: each document in turn, stored as it is finished, then the manifest and the
 * ZIP. Safe to run again at any point and by two workers at once: finished documents are kept, every build gives the
 * same bytes, and the bundle becomes ready in the one transaction that also stores its ZIP.
 */
export async function buildBundle(
  ctx: RequestContext,
  input: { leagueId: string; batchId: string },
): Promise<'built' | 'already there'> {
  const { leagueId, batchId } = input;
  const start = await withLeague(leagueId, async (tx) => {
    const bundle = await findBundle(tx, batchId);
    const released = await findSnapshot(tx, batchId);
    const batch = await findBatchById(tx, batchId);
    if (!bundle || !released || !batch) return undefined;
    return { bundle, released, batch, stored: await listStoredParts(tx, bundle.id) };
  });
  if (!start || start.bundle.state === 'ready') return 'already there';
  const { bundle, released, batch } = start;

  const parts = listBundleParts(released.snapshot);
  const total = parts.reduce((sum, part) => sum + part.units, 0) + 1;
  const report = (done: number, doing: string) =>
    withLeague(leagueId, (tx) =>
      updateBundleProgress(tx, bundle.id, { done, total, doing, startedAt: ctx.now }),
    );

  let done = 0;
  const finished = new Set(start.stored.map((part) => part.path));
  for (const [position, part] of parts.entries()) {
    if (!finished.has(part.path)) {
      await report(done, part.label);
      let reported = 0;
      const before = done;
      const bytes = await part.build(async (unit) => {
        if (unit - reported < reportEvery) return;
        reported = unit;
        await report(before + unit, part.label);
      });
      await storePart({ ...part, position }, bytes);
    }
    done += part.units;
  }

  const stored = await withLeague(leagueId, (tx) => listStoredParts(tx, bundle.id));
  await report(done, 'Manifest and ZIP');
  const manifest = buildManifest(released.snapshot, released.sha256, stored);
  if (!finished.has(manifest.path)) {
    await storePart({ ...manifest, position: parts.length }, manifest.bytes);
  }

  return withLeague(leagueId, async (tx) => {
    // Whoever comes second waits here and then finds the bundle ready.
    const locked = await lockBundle(tx, batchId);
    if (!locked || locked.state === 'ready') return 'already there';
    const files = await listStoredParts(tx, bundle.id);
    const zip = zipBundle(
      released.snapshot,
      files.map((file) => ({
        path: file.path,
        bytes: file.bytes,
        read: () => readStoredFile(leagueId, file.fileId, { start: 0, end: file.bytes - 1 }),
      })),
    );
    const stamp = { ...ctx, userId: null };
    const file = await insertStoredFile(tx, { id: ctx.newId(), now: ctx.now }, zip);
    await updateBundleState(tx, bundle.id, { state: 'ready', zipFileId: file.id, now: ctx.now });
    await insertAuditEvent(tx, stamp, {
      type: 'bundle built',
      subjectId: batchId,
      data: { code: batch.code, files: files.length, bytes: file.bytes },
    });
    return 'built';
  });

  async function storePart(
    part: { path: string; label: string; mediaType: string; position: number },
    bytes: Uint8Array,
  ): Promise<void> {
    await withLeague(leagueId, async (tx) => {
      const fileId = ctx.newId();
      await insertStoredFile(tx, { id: fileId, now: ctx.now }, [bytes]);
      await insertBundlePart(tx, {
        bundleId: bundle.id,
        path: part.path,
        label: part.label,
        mediaType: part.mediaType,
        position: part.position,
        fileId,
      });
    });
  }
}

/** Notes that a build gave up, so that the page can say so and offer another try. */
export async function failBundle(
  ctx: RequestContext,
  input: { leagueId: string; batchId: string },
): Promise<void> {
  await withLeague(input.leagueId, async (tx) => {
    const bundle = await lockBundle(tx, input.batchId);
    if (!bundle) return;
    const failure = `The bundle could not be built. Try again; if it fails again, quote ${ctx.requestId.slice(0, 8)}.`;
    await updateBundleState(tx, bundle.id, { state: 'failed', failure, now: ctx.now });
  });
}
