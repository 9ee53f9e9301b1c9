import { readFileSync } from 'node:fs';
import path from 'node:path';
import { prepareZXingModule, readBarcodes } from 'zxing-wasm/reader';
import type { GrayImage } from './gray-image';

const wasm = readFileSync(path.join(process.cwd(), 'node_modules/zxing-wasm/dist/reader/zxing_reader.wasm'));
// By default the reader fetches its program from the network; tests hand it over instead.
prepareZXingModule({ overrides: { wasmBinary: new Uint8Array(wasm).buffer } });

/** The QR codes that an independent reader (ZXing) finds in a picture: text, error correction level, version. */
export async function readQrCodes(
  image: GrayImage,
): Promise<{ text: string; level: string; version: string }[]> {
  const data = new Uint8ClampedArray(image.width * image.height * 4);
  image.pixels.forEach((pixel, at) => data.set([pixel, pixel, pixel, 255], at * 4));
  const found = await readBarcodes(
    { data, width: image.width, height: image.height, colorSpace: 'srgb' } as ImageData,
    { formats: ['QRCode'] },
  );
  return found.map((code) => ({ text: code.text, level: code.ecLevel, version: code.version }));
}
