import { beforeAll, describe, expect, it } from 'vitest';
import { isBagCode } from '@/lib/domain/batch/bag-code';
import { listBundleParts } from '@/lib/documents/bundle';
import { makeTwoTeams } from '@/tests/factories/snapshots';
import { findInk, type GrayImage } from '@/tests/support/documents/gray-image';
import { rasterise } from '@/tests/support/documents/pdf-tools';
import { readQrCodes } from '@/tests/support/documents/read-qr-codes';

const snapshot = makeTwoTeams();
const codes = snapshot.teams.flatMap((team) => team.players.map((player) => player.bagCode));
let pages: GrayImage[];
let pdf: Uint8Array;

beforeAll(async () => {
  const labels = listBundleParts(snapshot).find((part) => part.path === 'bag-labels.pdf');
  if (!labels) throw new Error('no labels');
  pdf = await labels.build();
  pages = rasterise(pdf, 300);
}, 60_000);

describe('the code on a bag label', () => {
  it('is read back by an independent reader at 300 dpi, on every label, as QR of level M', async () => {
    const found = [];
    for (const page of pages) found.push(await readQrCodes(page));
    expect(found).toEqual(codes.map((text) => [{ text, level: 'M', version: '1' }]));
    expect(codes.every(isBagCode)).toBe(true);
  }, 60_000);

  it('is read from a coarse print of 150 dpi too', async () => {
    const [coarse] = rasterise(pdf, 150, { first: 5, last: 5 });
    if (!coarse) throw new Error('no page');
    expect((await readQrCodes(coarse)).map((code) => code.text)).toEqual([codes[4]]);
  });

  it('has four modules of white on every side (ISO/IEC 18004, quiet zone)', () => {
    // The symbol is 30 mm wide with its corner at 65.6, 32 mm; 21 modules, so four are 5.7 mm. In dots at 300 dpi:
    const dots = (mm: number) => Math.round((mm / 25.4) * 300);
    const side = dots(30);
    const quiet = Math.floor(dots((30 / 21) * 4)) - 1;
    const [x, y] = [dots(65.6), dots(32)];
    for (const page of pages) {
      const strips = [
        { x: x - quiet, y: y - quiet, width: side + 2 * quiet, height: quiet - 2 },
        { x: x - quiet, y: y + side + 2, width: side + 2 * quiet, height: quiet - 2 },
        { x: x - quiet, y, width: quiet - 2, height: side },
        { x: x + side + 2, y, width: quiet - 2, height: side },
      ];
      for (const strip of strips) expect(findInk(page, strip)).toBe(0);
    }
  });
});
