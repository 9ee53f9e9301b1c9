import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { listPackingNotes } from '@/lib/domain/packing/list-packing-notes';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import { listDrawingNotes } from './text/list-drawing-notes';

/** A finished file of the bundle, with its size in bytes and its SHA-256 in hexadecimal. */
export type ManifestFile = { path: string; label: string; mediaType: string; bytes: number; sha256: string };

const path = 'manifest.json';

/**
 * The last file of a bundle: what it was made from, the size and SHA-256 of every other file in the order given, and
 * sentences about what is missing or could not be printed. `snapshotSha256` is the hash under which the snapshot is
 * kept. An earlier manifest among the files is left out, since no file can hold its own hash.
 */
export function buildManifest(
  snapshot: BatchSnapshot,
  snapshotSha256: string,
  files: readonly ManifestFile[],
): { path: string; label: string; mediaType: string; bytes: Uint8Array } {
  const { paper: _paper, ...batch } = snapshot.batch;
  const manifest = {
    format: 'raglan-bundle',
    formatVersion: 1,
    batch,
    snapshotSha256,
    counts: {
      teams: snapshot.teams.length,
      players: snapshot.teams.reduce((sum, team) => sum + team.players.length, 0),
      pieces: listPieces(snapshot).length,
    },
    files: files
      .filter((file) => file.path !== path)
      .map(({ path: filePath, label, mediaType, bytes, sha256 }) => ({
        path: filePath,
        label,
        mediaType,
        bytes,
        sha256,
      })),
    notes: [...listPackingNotes(snapshot), ...listDrawingNotes(snapshot)],
  };
  const bytes = new TextEncoder().encode(`${JSON.stringify(manifest, null, 2)}\n`);
  return { path, label: 'Manifest with checksums', mediaType: 'application/json', bytes };
}
