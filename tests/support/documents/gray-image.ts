import { deflateSync, inflateSync } from 'node:zlib';

/** A picture in shades of grey, 0 black to 255 white, row by row. */
export type GrayImage = { width: number; height: number; pixels: Uint8Array };

/** Reads a binary PGM (P5, 255 shades), as pdftoppm -gray writes it. */
export function readPgm(file: Buffer): GrayImage {
  const head = /^P5\s(?:#.*\n)*(\d+)\s+(\d+)\s+255\s/.exec(file.subarray(0, 200).toString('latin1'));
  if (!head) throw new Error('This is no PGM picture.');
  const [width, height] = [Number(head[1]), Number(head[2])];
  return {
    width,
    height,
    pixels: new Uint8Array(file.subarray(head[0].length, head[0].length + width * height)),
  };
}

const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);

/** Writes a grey PNG, every row unfiltered (PNG, W3C, filter type 0): what `readPng` can read again. */
export function writePng({ width, height, pixels }: GrayImage): Buffer {
  const head = Buffer.alloc(13);
  head.writeUInt32BE(width, 0);
  head.writeUInt32BE(height, 4);
  head.set([8, 0, 0, 0, 0], 8);
  const rows = Buffer.alloc(height * (width + 1));
  for (let y = 0; y < height; y += 1)
    rows.set(pixels.subarray(y * width, (y + 1) * width), y * (width + 1) + 1);
  return Buffer.concat([
    signature,
    writeChunk('IHDR', head),
    writeChunk('IDAT', deflateSync(rows, { level: 9 })),
    writeChunk('IEND', Buffer.alloc(0)),
  ]);
}

function writeChunk(kind: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(kind, 'latin1'), data]);
  const chunk = Buffer.alloc(body.length + 8);
  chunk.writeUInt32BE(data.length, 0);
  chunk.set(body, 4);
  chunk.writeUInt32BE(crc32(body), body.length + 4);
  return chunk;
}

/** The checksum of a PNG chunk (PNG, W3C, annex D), which Node has only from 20.15 on. */
function crc32(data: Uint8Array): number {
  let crc = 0xffffffff;
  for (const byte of data) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit += 1) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return (crc ^ 0xffffffff) >>> 0;
}

/** Reads a PNG that `writePng` wrote. */
export function readPng(file: Buffer): GrayImage {
  const width = file.readUInt32BE(16);
  const height = file.readUInt32BE(20);
  const parts: Buffer[] = [];
  for (let at = 8; at < file.length;) {
    const length = file.readUInt32BE(at);
    if (file.toString('latin1', at + 4, at + 8) === 'IDAT')
      parts.push(file.subarray(at + 8, at + 8 + length));
    at += length + 12;
  }
  const rows = inflateSync(Buffer.concat(parts));
  const pixels = new Uint8Array(width * height);
  for (let y = 0; y < height; y += 1) {
    pixels.set(rows.subarray(y * (width + 1) + 1, (y + 1) * (width + 1)), y * width);
  }
  return { width, height, pixels };
}

/**
 * How many pixels differ by more than a third of the scale (all of them when the sizes differ), and a picture of where:
 * black on the new picture in pale.
 */
export function compareImages(
  expected: GrayImage,
  found: GrayImage,
): { differing: number; difference: GrayImage } {
  const sameSize = expected.width === found.width && expected.height === found.height;
  let differing = 0;
  const pixels = found.pixels.map((pixel, at) => {
    const far = !sameSize || Math.abs(pixel - (expected.pixels[at] ?? 0)) > 85;
    if (far) differing += 1;
    return far ? 0 : 224 + pixel / 8;
  });
  return { differing, difference: { ...found, pixels } };
}

/** The share of pixels in a part of a picture that are darker than light grey. */
export function findInk(
  image: GrayImage,
  part: { x: number; y: number; width: number; height: number } = { x: 0, y: 0, ...image },
): number {
  let dark = 0;
  for (let y = part.y; y < part.y + part.height; y += 1) {
    for (let x = part.x; x < part.x + part.width; x += 1) {
      if ((image.pixels[y * image.width + x] ?? 255) < 200) dark += 1;
    }
  }
  return dark / (part.width * part.height);
}
