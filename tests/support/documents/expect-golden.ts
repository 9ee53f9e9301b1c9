import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { expect } from 'vitest';
import { compareImages, readPng, writePng, type GrayImage } from './gray-image';

const expectedFolder = 'tests/golden/expected';
const resultFolder = 'test-results/golden';

/** Pixels that may differ: fewer than one letter of the smallest print, more than rounding on another processor. */
export const fewPixels = 10;

/**
 * Compares a page with the picture kept for it. When they differ, the kept, the new and the difference are written to
 * test-results/golden. After an intended change, look at the new pictures and keep them: `GOLDEN=keep` with the test.
 */
export function expectGolden(name: string, found: GrayImage): void {
  const kept = path.join(expectedFolder, `${name}.png`);
  if (process.env.GOLDEN === 'keep') {
    mkdirSync(expectedFolder, { recursive: true });
    writeFileSync(kept, writePng(found));
    return;
  }
  if (!existsSync(kept))
    throw new Error(`No picture is kept for ${name}: run the test once with GOLDEN=keep.`);
  const expected = readPng(readFileSync(kept));
  const { differing, difference } = compareImages(expected, found);
  if (differing > fewPixels) {
    mkdirSync(resultFolder, { recursive: true });
    for (const [kind, image] of Object.entries({ old: expected, new: found, difference })) {
      writeFileSync(path.join(resultFolder, `${name}-${kind}.png`), writePng(image));
    }
  }
  expect(differing, `${name} differs: see ${resultFolder}/${name}-difference.png`).toBeLessThanOrEqual(
    fewPixels,
  );
}
