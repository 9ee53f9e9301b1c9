import { makeZip, predictLength } from 'client-zip';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';

/** A file to put into the ZIP: its size in bytes is known, its content is read when its turn comes. */
export type ZipEntry = { path: string; bytes: number; read: () => AsyncIterable<Uint8Array> };

/**
 * The files in this order as a ZIP, streamed: never more than a piece of one file is in memory. Stored without
 * compression (PDFs are compressed already), names in UTF-8, every date the batch's release: the same files give the
 * same bytes on any machine. The stream fails if a file has another size than was said, so that no half file goes out.
 */
export function zipBundle(snapshot: BatchSnapshot, files: readonly ZipEntry[]): ReadableStream<Uint8Array> {
  const lastModified = new ClockFreeDate(clampToZip(snapshot.batch.releasedAt));
  return makeZip(
    files.map((file) => ({ name: file.path, lastModified, input: readWhole(file) })),
    { buffersAreUTF8: true },
  );
}

/** The exact size in bytes of the ZIP that `zipBundle` makes of these files. */
export const predictZipBytes = (files: readonly Pick<ZipEntry, 'path' | 'bytes'>[]): number =>
  Number(predictLength(files.map((file) => ({ name: file.path, size: file.bytes }))));

async function* readWhole({ path, bytes, read }: ZipEntry): AsyncGenerator<Uint8Array> {
  let sent = 0;
  for await (const piece of read()) {
    sent += piece.byteLength;
    yield piece;
  }
  if (sent !== bytes) throw new Error(`${path} has ${sent} bytes where ${bytes} were promised.`);
}

/** A ZIP can hold dates from 1980 to 2107 only (source: PKWARE APPNOTE 4.4.6, MS-DOS date). */
const clampToZip = (instant: string): number =>
  Math.min(Math.max(new Date(instant).getTime(), Date.UTC(1980, 0, 1)), Date.UTC(2107, 11, 31));

/**
 * The writer reads a date on the clock of the machine it runs on, so the same batch would give other bytes in another
 * time zone. This date answers in UTC everywhere.
 */
class ClockFreeDate extends Date {
  override getFullYear(): number {
    return this.getUTCFullYear();
  }
  override getMonth(): number {
    return this.getUTCMonth();
  }
  override getDate(): number {
    return this.getUTCDate();
  }
  override getHours(): number {
    return this.getUTCHours();
  }
  override getMinutes(): number {
    return this.getUTCMinutes();
  }
  override getSeconds(): number {
    return this.getUTCSeconds();
  }
}
