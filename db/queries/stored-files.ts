import { createHash } from 'node:crypto';
import { withLeague, type LeagueTx } from '../tenant';

/** Chunks of a quarter megabyte: small enough to stream, large enough that a bundle is few rows. */
const chunkBytes = 256 * 1024;

export type StoredFile = { id: string; bytes: number; sha256: string };

/**
 * Stores a file from a stream of pieces of any size, chunk by chunk, and answers its size and SHA-256. The whole file
 * appears with the transaction or not at all; at no time is more than one chunk in memory.
 */
export async function insertStoredFile(
  tx: LeagueTx,
  stamp: { id: string; now: Date },
  pieces: AsyncIterable<Uint8Array> | Iterable<Uint8Array>,
): Promise<StoredFile> {
  const hash = createHash('sha256');
  let pending: Uint8Array[] = [];
  let pendingBytes = 0;
  let bytes = 0;
  let seq = 0;
  const flush = async (data: Buffer) => {
    await tx
      .insertInto('stored_chunks')
      .values({ league_id: tx.leagueId, file_id: stamp.id, seq, data })
      .execute();
    seq += 1;
  };
  for await (const piece of pieces) {
    hash.update(piece);
    bytes += piece.byteLength;
    pending.push(piece);
    pendingBytes += piece.byteLength;
    if (pendingBytes < chunkBytes) continue;
    let whole = Buffer.concat(pending);
    while (whole.length >= chunkBytes) {
      await flush(whole.subarray(0, chunkBytes));
      whole = whole.subarray(chunkBytes);
    }
    pending = whole.length > 0 ? [whole] : [];
    pendingBytes = whole.length;
  }
  if (pendingBytes > 0) await flush(Buffer.concat(pending));
  const file = { id: stamp.id, bytes, sha256: hash.digest('hex') };
  await tx
    .insertInto('stored_files')
    .values({ league_id: tx.leagueId, ...file, created_at: stamp.now })
    .execute();
  return file;
}

/** Removes a file and its chunks; nothing may point at it any more. */
export async function deleteStoredFile(tx: LeagueTx, fileId: string): Promise<void> {
  await tx.deleteFrom('stored_files').where('league_id', '=', tx.leagueId).where('id', '=', fileId).execute();
}

/**
 * The bytes from `start` to `end` (both included, counted from 0) of a stored file, a chunk at a time. Each chunk is
 * read in a transaction of its own, since a slow download must not hold a connection; stored files never change.
 */
export async function* readStoredFile(
  leagueId: string,
  fileId: string,
  range: { start: number; end: number },
): AsyncGenerator<Uint8Array> {
  const first = Math.floor(range.start / chunkBytes);
  const last = Math.floor(range.end / chunkBytes);
  for (let seq = first; seq <= last; seq += 1) {
    const row = await withLeague(leagueId, (tx) =>
      tx
        .selectFrom('stored_chunks')
        .select('data')
        .where('league_id', '=', leagueId)
        .where('file_id', '=', fileId)
        .where('seq', '=', seq)
        .executeTakeFirstOrThrow(),
    );
    const from = Math.max(range.start - seq * chunkBytes, 0);
    yield row.data.subarray(from, Math.min(range.end - seq * chunkBytes + 1, chunkBytes));
  }
}
