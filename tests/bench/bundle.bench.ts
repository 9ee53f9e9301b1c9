import { Bench } from 'tinybench';
import { listBundleParts } from '@/lib/documents/bundle';
import { buildManifest } from '@/lib/documents/bundle-manifest';
import { zipBundle } from '@/lib/documents/bundle-zip';
import { sha256 } from '@/lib/platform/ids';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { makeLargeBatch, makeTwoTeams } from '../factories/snapshots';

// The small batch is the yardstick of the same run: read the large one as a multiple of it.

async function bundle(snapshot: BatchSnapshot): Promise<number> {
  const files: {
    path: string;
    label: string;
    mediaType: string;
    bytes: number;
    sha256: string;
    data: Uint8Array;
  }[] = [];
  for (const part of listBundleParts(snapshot)) {
    const data = await part.build();
    files.push({
      path: part.path,
      label: part.label,
      mediaType: part.mediaType,
      bytes: data.byteLength,
      sha256: sha256(data),
      data,
    });
  }
  const manifest = buildManifest(snapshot, 'hash', files);
  const entries = [
    ...files.map(({ path, data }) => ({ path, data })),
    { path: manifest.path, data: manifest.bytes },
  ];
  let bytes = 0;
  const zip = zipBundle(
    snapshot,
    entries.map(({ path, data }) => ({
      path,
      bytes: data.byteLength,
      async *read() {
        yield await Promise.resolve(data);
      },
    })),
  );
  for await (const chunk of zip) bytes += chunk.byteLength;
  return bytes;
}

let peak = 0;
const watch = setInterval(() => (peak = Math.max(peak, process.memoryUsage.rss())), 20);
const bench = new Bench({ iterations: 3, time: 0, warmupIterations: 1, warmupTime: 0 });
bench
  .add('bundle of 24 players', async () => {
    await bundle(makeTwoTeams());
  })
  .add('bundle of some 500 garments', async () => {
    await bundle(makeLargeBatch());
  });
await bench.run();
clearInterval(watch);
console.table(bench.table());
console.log(`peak memory of this process: ${Math.round(peak / 1_000_000)} MB`);
