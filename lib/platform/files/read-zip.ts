import { promisify } from 'node:util';
import { inflateRaw } from 'node:zlib';

const inflate = promisify(inflateRaw);

/** What an archive may be: unpacked `bytes` in all, `ratio` of unpacked to packed (from 1 MB up), number of `entries`. */
const zipLimits = { bytes: 60 * 1024 * 1024, ratio: 100, entries: 2000 } as const;
const ratioCountsFrom = 1024 * 1024;

/** One file of an archive, as its directory describes it; sizes are claims until it has been unpacked. */
type ZipEntry = {
  name: string;
  method: number;
  packed: number;
  unpacked: number;
  encrypted: boolean;
  at: number;
};

export type ZipFault = 'damaged' | 'encrypted' | 'too large' | 'too many entries';
export type ZipListing =
  { ok: true; names: string[]; entries: Map<string, ZipEntry> } | { ok: false; fault: ZipFault };

/** Layout of the records. Source: PKWARE, .ZIP File Format Specification (APPNOTE), sections 4.3.7, 4.3.12 and 4.3.16. */
const endRecord = 0x06054b50;
const directoryRecord = 0x02014b50;
const localRecord = 0x04034b50;

/** The offset of the end record: 22 bytes and a comment of at most 65,535 before the end of the file; -1 if missing. */
function findEnd(view: DataView): number {
  const lowest = Math.max(0, view.byteLength - 22 - 0xffff);
  for (let at = view.byteLength - 22; at >= lowest; at -= 1) {
    if (view.getUint32(at, true) === endRecord) return at;
  }
  return -1;
}

/** Reads the directory without unpacking anything. Bounds are checked; a directory that points outside is damaged. */
function readDirectory(bytes: Uint8Array): ZipListing {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const end = findEnd(view);
  if (end < 0) return { ok: false, fault: 'damaged' };
  const count = view.getUint16(end + 10, true);
  if (count > zipLimits.entries) return { ok: false, fault: 'too many entries' };
  const entries = new Map<string, ZipEntry>();
  let at = view.getUint32(end + 16, true);
  for (let index = 0; index < count; index += 1) {
    if (at + 46 > end || view.getUint32(at, true) !== directoryRecord) return { ok: false, fault: 'damaged' };
    const nameLength = view.getUint16(at + 28, true);
    if (at + 46 + nameLength > end) return { ok: false, fault: 'damaged' };
    const name = new TextDecoder()
      .decode(bytes.subarray(at + 46, at + 46 + nameLength))
      .replaceAll('\\', '/');
    // Two entries of one name are a way to show a checker one file and a reader another.
    if (entries.has(name)) return { ok: false, fault: 'damaged' };
    entries.set(name, {
      name,
      method: view.getUint16(at + 10, true),
      packed: view.getUint32(at + 20, true),
      unpacked: view.getUint32(at + 24, true),
      encrypted: (view.getUint16(at + 8, true) & 1) === 1,
      at: view.getUint32(at + 42, true),
    });
    at += 46 + nameLength + view.getUint16(at + 30, true) + view.getUint16(at + 32, true);
  }
  return { ok: true, names: [...entries.keys()], entries };
}

/**
 * Lists the files of a ZIP archive from its directory, unpacking nothing, and refuses what claims to be too much:
 * over 2,000 entries, over 60 MB unpacked, or over 100 times the size of the archive. Never throws.
 */
export function listZip(bytes: Uint8Array): ZipListing {
  const listing = readDirectory(bytes);
  if (!listing.ok) return listing;
  const unpacked = [...listing.entries.values()].reduce((sum, entry) => sum + entry.unpacked, 0);
  if (unpacked > zipLimits.bytes || isOutOfProportion(unpacked, bytes.length)) {
    return { ok: false, fault: 'too large' };
  }
  return [...listing.entries.values()].some(({ encrypted }) => encrypted)
    ? { ok: false, fault: 'encrypted' }
    : listing;
}

const isOutOfProportion = (unpacked: number, packed: number): boolean =>
  unpacked > ratioCountsFrom && unpacked > packed * zipLimits.ratio;

export type ZipUnpacking = { ok: true; files: Map<string, Uint8Array> } | { ok: false; fault: ZipFault };

/**
 * Unpacks the named files of a listed archive; names it doesn't have are left out. The directory's sizes are not
 * believed: unpacking stops where the files together pass 60 MB or 100 times the archive. Never throws.
 */
export async function unpackZip(
  bytes: Uint8Array,
  listing: Extract<ZipListing, { ok: true }>,
  names: readonly string[],
): Promise<ZipUnpacking> {
  const files = new Map<string, Uint8Array>();
  let room: number = Math.min(zipLimits.bytes, Math.max(ratioCountsFrom, bytes.length * zipLimits.ratio));
  for (const name of new Set(names)) {
    const entry = listing.entries.get(name);
    if (!entry) continue;
    const unpacked = await unpackEntry(bytes, entry, room);
    if (typeof unpacked === 'string') return { ok: false, fault: unpacked };
    room -= unpacked.length;
    files.set(name, unpacked);
  }
  return { ok: true, files };
}

async function unpackEntry(bytes: Uint8Array, entry: ZipEntry, room: number): Promise<Uint8Array | ZipFault> {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  if (entry.at + 30 > bytes.length || view.getUint32(entry.at, true) !== localRecord) return 'damaged';
  const start = entry.at + 30 + view.getUint16(entry.at + 26, true) + view.getUint16(entry.at + 28, true);
  if (start + entry.packed > bytes.length) return 'damaged';
  const packed = bytes.subarray(start, start + entry.packed);
  if (entry.method === 0) return packed.length > room ? 'too large' : packed;
  if (entry.method !== 8) return 'damaged';
  try {
    // One byte more than there is room for, since a limit of nothing means no limit.
    return await inflate(packed, { maxOutputLength: Math.max(1, room) });
  } catch (error) {
    return error instanceof RangeError ? 'too large' : 'damaged';
  }
}
