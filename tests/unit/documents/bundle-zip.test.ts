import JSZip from 'jszip';
import { describe, expect, it } from 'vitest';
import { predictZipBytes, zipBundle, type ZipEntry } from '@/lib/documents/bundle-zip';
import { makeTwoTeams } from '@/tests/factories/snapshots';

const entry = (path: string, ...pieces: string[]): ZipEntry => ({
  path,
  bytes: Buffer.byteLength(pieces.join('')),
  read: async function* () {
    for (const piece of pieces) yield Buffer.from(piece);
  },
});
const collect = async (stream: ReadableStream<Uint8Array>) =>
  Buffer.from(await new Response(stream).arrayBuffer());

const files = [
  entry('data/pieces.csv', 'a,', 'b\r\n'),
  entry('lists/Ňandú-東.pdf', '%PDF'),
  entry('empty.txt'),
];

describe('the ZIP of a bundle', () => {
  it('holds every file whole under its name, in the order given, dated with the release', async () => {
    const zip = await JSZip.loadAsync(await collect(zipBundle(makeTwoTeams(), files)), { checkCRC32: true });
    expect(Object.keys(zip.files)).toEqual(files.map((file) => file.path));
    expect(await zip.file('data/pieces.csv')?.async('string')).toBe('a,b\r\n');
    expect(await zip.file('lists/Ňandú-東.pdf')?.async('string')).toBe('%PDF');
    for (const file of Object.values(zip.files))
      expect(file.date.toISOString()).toBe('2027-09-17T08:12:00.000Z');
  });

  it('has exactly the size that was predicted for it', async () => {
    const zip = await collect(zipBundle(makeTwoTeams(), files));
    expect(predictZipBytes(files)).toBe(zip.byteLength);
  });

  it('is the same bytes however the files come in pieces', async () => {
    const whole = [entry('data/pieces.csv', 'a,b\r\n'), ...files.slice(1)];
    const one = await collect(zipBundle(makeTwoTeams(), files));
    expect((await collect(zipBundle(makeTwoTeams(), whole))).equals(one)).toBe(true);
  });

  it('reads a file only when its turn comes', async () => {
    const opened: string[] = [];
    const watched = files.map((file) => ({
      ...file,
      read: () => {
        opened.push(file.path);
        return file.read();
      },
    }));
    const reader = zipBundle(makeTwoTeams(), watched).getReader();
    await reader.read();
    expect(opened.length).toBeLessThan(3);
    await reader.cancel();
  });

  it('breaks off when a stored file is shorter than its size, instead of handing out half a bundle', async () => {
    const short = { ...entry('bag-labels.pdf', '%PDF'), bytes: 9 };
    await expect(collect(zipBundle(makeTwoTeams(), [short]))).rejects.toThrow(
      /4 bytes where 9 were promised/,
    );
  });

  it('takes dates a ZIP cannot hold as the nearest it can', async () => {
    const zip = await JSZip.loadAsync(
      await collect(zipBundle(makeTwoTeams({ releasedAt: '1970-01-01T00:00:00.000Z' }), files)),
    );
    expect(zip.file('empty.txt')?.date.getUTCFullYear()).toBe(1980);
  });
});
