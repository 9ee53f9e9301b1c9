import { describe, expect, it } from 'vitest';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { listBundleParts } from '@/lib/documents/bundle';
import { makeHostileBatch, makeTwoTeams } from '@/tests/factories/snapshots';
import { expectGolden, fewPixels } from '@/tests/support/documents/expect-golden';
import { compareImages, type GrayImage } from '@/tests/support/documents/gray-image';
import { rasterise } from '@/tests/support/documents/pdf-tools';

const sheetDpi = 80;
const labelDpi = 100;

async function drawPage(
  snapshot: BatchSnapshot,
  path: string,
  page: number,
  dpi: number,
): Promise<GrayImage> {
  const part = listBundleParts(snapshot).find((entry) => entry.path === path);
  if (!part) throw new Error(`no ${path}`);
  const [image] = rasterise(await part.build(), dpi, { first: page, last: page });
  if (!image) throw new Error(`${path} has no page ${page}`);
  return image;
}

const hostile = makeHostileBatch({ paper: 'Letter' });
const pages = [
  { name: 'packing-list', snapshot: makeTwoTeams(), path: 'packing-lists/otters.pdf', page: 1 },
  { name: 'packing-list-hostile-1', snapshot: hostile, path: 'packing-lists/etc-otters-sons.pdf', page: 1 },
  { name: 'packing-list-hostile-2', snapshot: hostile, path: 'packing-lists/etc-otters-sons.pdf', page: 2 },
  { name: 'packing-list-empty', snapshot: hostile, path: 'packing-lists/herons.pdf', page: 1 },
  { name: 'garments', snapshot: makeTwoTeams(), path: 'pull-list-garments.pdf', page: 1 },
  { name: 'digits', snapshot: makeTwoTeams(), path: 'pull-list-digits.pdf', page: 1 },
  { name: 'digits-hostile', snapshot: hostile, path: 'pull-list-digits.pdf', page: 1 },
];
const labels = [
  { name: 'label', snapshot: makeTwoTeams(), page: 2 },
  { name: 'label-long', snapshot: hostile, page: 2 },
  { name: 'label-vietnamese', snapshot: hostile, page: 4 },
  { name: 'label-hebrew', snapshot: hostile, page: 7 },
  { name: 'label-arabic', snapshot: hostile, page: 9 },
  { name: 'label-boxes', snapshot: hostile, page: 15 },
];

describe('documents', () => {
  it.each(pages)('the page $name is drawn as it was approved', async ({ name, snapshot, path, page }) => {
    expectGolden(name, await drawPage(snapshot, path, page, sheetDpi));
  });

  it.each(labels)('the page $name is drawn as it was approved', async ({ name, snapshot, page }) => {
    expectGolden(name, await drawPage(snapshot, 'bag-labels.pdf', page, labelDpi));
  });

  it('are compared closely enough that one changed letter, size or colour is noticed', async () => {
    const before = makeTwoTeams();
    const draw = (snapshot: BatchSnapshot) => drawPage(snapshot, 'packing-lists/otters.pdf', 1, sheetDpi);
    const found = await draw(before);
    const change = (edit: (copy: BatchSnapshot) => void): BatchSnapshot => {
      const copy = structuredClone(before);
      edit(copy);
      return copy;
    };
    const [name, size, sleeves] = [
      change(({ teams: [team] }) => team?.players.slice(0, 1).forEach((p) => (p.name = 'Adisa, Wrem'))),
      change(({ teams: [team] }) => team?.players.slice(0, 1).forEach((p) => (p.sizes.shorts = 'YL'))),
      change(({ teams }) => teams.slice(0, 1).forEach((team) => (team.kits.home.sleeves = '#ffffff'))),
    ];
    for (const snapshot of [name, size]) {
      expect(compareImages(found, await draw(snapshot)).differing).toBeGreaterThan(fewPixels);
    }
    // Pale blue and white are near in grey: the picture would pass, so the colours are looked at in the file.
    const part = (snapshot: BatchSnapshot) => listBundleParts(snapshot)[0]?.build();
    expect(await part(sleeves)).not.toEqual(await part(before));
  });
});
