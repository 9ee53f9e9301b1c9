import { findSnapshot, listBatchEvents, listBatchRosters } from '@/db/queries/batches';
import { findBundle, listBundleParts } from '@/db/queries/bundles';
import { withLeague } from '@/db/tenant';
import type { BundleProgress } from '@/lib/domain/batch/bundle-progress';
import { can } from '@/lib/domain/access/permissions';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import { pullDigits } from '@/lib/domain/packing/pull-digits';
import { pullGarments } from '@/lib/domain/packing/pull-garments';
import { AppError } from '@/lib/platform/errors';
import { findVisibleBatch } from '../batch-guards';
import type { ActorContext } from '../context';

/** A batch with its teams, what it asks the shop to pull and press, and how far its bundle is. */
export async function getBatch(ctx: ActorContext, input: { code: string }) {
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await findVisibleBatch(tx, ctx, input.code);
    const rosters = batch.state === 'held' ? await listBatchRosters(tx, batch.id) : [];
    const released = await findSnapshot(tx, batch.id);
    const bundle = await findBundle(tx, batch.id);
    const scope = { shopId: batch.shop.id };
    return {
      batch,
      heldTeams: rosters.map((roster) => ({ id: roster.teamId, name: roster.team, state: roster.state })),
      events: await listBatchEvents(tx, batch.id),
      contents: released ? summariseSnapshot(released.snapshot) : null,
      snapshotSha256: released?.sha256 ?? null,
      bundle: bundle ?? null,
      parts: bundle?.state === 'ready' ? await listBundleParts(tx, bundle.id) : [],
      may: {
        change: can(ctx.actor, 'batch.make'),
        mark: can(ctx.actor, 'batch.mark', scope),
        receive: can(ctx.actor, 'batch.receive'),
      },
    };
  });
}

type Snapshot = NonNullable<Awaited<ReturnType<typeof findSnapshot>>>['snapshot'];

function summariseSnapshot(snapshot: Snapshot) {
  const pieces = listPieces(snapshot);
  return {
    teams: snapshot.teams.map((team) => ({
      id: team.id,
      name: team.name,
      division: team.division,
      kit: team.kits.home,
      players: team.players.length,
    })),
    players: snapshot.teams.reduce((sum, team) => sum + team.players.length, 0),
    pieces: pieces.length,
    garments: pullGarments(pieces),
    digits: pullDigits(pieces),
  };
}

/** How far the bundle of a batch is: for the progress line that a page asks for every moment or so. */
export async function getBundleState(ctx: ActorContext, input: { code: string }): Promise<BundleProgress> {
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await findVisibleBatch(tx, ctx, input.code);
    const bundle = await findBundle(tx, batch.id);
    if (!bundle)
      throw new AppError(
        'not-found',
        `Batch ${batch.code} has no bundle yet; it is made when the batch is released.`,
      );
    const { state, done, total, doing, failure, bytes } = bundle;
    return { state, done, total, doing, failure, bytes };
  });
}
