import { createHash } from 'node:crypto';
import { listBundleParts } from '@/lib/documents/bundle';
import { zipBundle } from '@/lib/documents/bundle-zip';
import { makeHostileBatch, makeTwoTeams } from '@/tests/factories/snapshots';

// Run by itself, in another time zone and locale, to see that a bundle is the same bytes there.
const hash = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex');

/** SHA-256 of every file of two bundles and of their ZIPs, by path. */
export async function hashBundles(): Promise<Record<string, string>> {
  const hashes: Record<string, string> = {};
  for (const [name, snapshot] of Object.entries({ two: makeTwoTeams(), hostile: makeHostileBatch() })) {
    const files = [];
    for (const part of listBundleParts(snapshot)) {
      const bytes = await part.build();
      hashes[`${name}/${part.path}`] = hash(bytes);
      files.push({
        path: part.path,
        bytes: bytes.byteLength,
        read: async function* () {
          yield bytes;
        },
      });
    }
    const zip = new Uint8Array(await new Response(zipBundle(snapshot, files)).arrayBuffer());
    hashes[`${name}.zip`] = hash(zip);
  }
  return hashes;
}

if (process.argv[1]?.endsWith('print-bundle-hashes.ts')) console.log(JSON.stringify(await hashBundles()));
