import { beforeAll, describe, expect, it } from 'vitest';
import { listBundleParts } from '@/lib/documents/bundle';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { tidyText } from '@/lib/domain/text/normalise-text';
import {
  makeGarment,
  makeHostileBatch,
  makePlayer,
  makeSnapshotOf,
  makeTeam,
  makeTwoTeams,
} from '@/tests/factories/snapshots';
import { findInk } from '@/tests/support/documents/gray-image';
import { rasterise, readPdfText, readPdfWords, type PdfWord } from '@/tests/support/documents/pdf-tools';

const build = async (snapshot: BatchSnapshot, path: string): Promise<Uint8Array> => {
  const part = listBundleParts(snapshot).find((entry) => entry.path === path);
  if (!part) throw new Error(`no ${path}`);
  return part.build();
};

/** A batch with as much of everything as the forms allow, so that every column and every table breaks somewhere. */
function makeWideBatch(paper: 'A4' | 'Letter'): BatchSnapshot {
  const run = Array.from({ length: 40 }, (_, at) => ({ code: `size ${at}`, label: `Size number ${at}` }));
  const garments = Array.from({ length: 11 }, (_, at) =>
    makeGarment({
      code: `g-${at}`,
      name: `Garment ${at} ${'with a name '.repeat(4)}`.slice(0, 60),
      sizes: run,
    }),
  );
  const players = Array.from({ length: 45 }, (_, at) =>
    makePlayer(at, {
      nameOnBack: 'W'.repeat(60),
      number: String(at * 37),
      sizes: Object.fromEntries(
        garments.map((garment, index) => [garment.code, `size ${(at * 3 + index) % 40}`]),
      ),
    }),
  );
  return makeSnapshotOf([makeTeam({ garments, players, slug: 'otters' })], { paper });
}

const hostile = makeHostileBatch({ paper: 'Letter' });
const documents: { name: string; snapshot: BatchSnapshot; path: string }[] = [
  { name: 'packing list', snapshot: makeTwoTeams(), path: 'packing-lists/otters.pdf' },
  { name: 'packing list of hostile names', snapshot: hostile, path: 'packing-lists/etc-otters-sons.pdf' },
  { name: 'packing list without players', snapshot: hostile, path: 'packing-lists/herons.pdf' },
  {
    name: 'packing list with 22 pieces a player',
    snapshot: makeWideBatch('A4'),
    path: 'packing-lists/otters.pdf',
  },
  { name: 'garments', snapshot: makeTwoTeams(), path: 'pull-list-garments.pdf' },
  { name: 'garments of hostile names', snapshot: hostile, path: 'pull-list-garments.pdf' },
  { name: 'garments in 40 sizes', snapshot: makeWideBatch('Letter'), path: 'pull-list-garments.pdf' },
  { name: 'digits', snapshot: makeTwoTeams(), path: 'pull-list-digits.pdf' },
  { name: 'digits of hostile labels', snapshot: hostile, path: 'pull-list-digits.pdf' },
  { name: 'labels', snapshot: makeTwoTeams(), path: 'bag-labels.pdf' },
  { name: 'labels of hostile names', snapshot: hostile, path: 'bag-labels.pdf' },
  { name: 'labels with 22 pieces a player', snapshot: makeWideBatch('A4'), path: 'bag-labels.pdf' },
];

/** Boxes of words come from the height of the font, more than ink: only their middle counts as overlap. */
function overlaps(a: PdfWord, b: PdfWord): boolean {
  const middle = (word: PdfWord) => {
    const height = word.bottom - word.top;
    const inset = height * (height > 60 ? 0.42 : 0.3);
    return { top: word.top + inset, bottom: word.bottom - inset };
  };
  const across = Math.min(a.right, b.right) - Math.max(a.left, b.left);
  const down = Math.min(middle(a).bottom, middle(b).bottom) - Math.max(middle(a).top, middle(b).top);
  return across > 0.5 && down > 0.3;
}

describe.each(documents)('the $name', ({ snapshot, path }) => {
  let pdf: Uint8Array;
  beforeAll(async () => {
    pdf = await build(snapshot, path);
  });

  it('has ink on every page and none in the margin', () => {
    const label = path === 'bag-labels.pdf';
    const edge = label ? 8 : 25; // dots at 72 dpi: 2.8 mm on a label, 8.8 mm on a sheet
    for (const page of rasterise(pdf, 72)) {
      expect(findInk(page)).toBeGreaterThan(0.004);
      const { width, height } = page;
      const frame = [
        { x: 0, y: 0, width, height: edge },
        { x: 0, y: height - edge, width, height: edge },
        { x: 0, y: 0, width: edge, height },
        { x: width - edge, y: 0, width: edge, height },
      ];
      for (const strip of frame) expect(findInk(page, strip)).toBe(0);
    }
  });

  it('keeps every word on the page and off every other word', () => {
    for (const { width, height, words } of readPdfWords(pdf)) {
      expect(words.length).toBeGreaterThan(3);
      const outside = words.filter((w) => w.left < 14 || w.right > width - 14 || w.bottom > height - 5);
      expect(outside).toEqual([]);
      const clashes = words.flatMap((word, at) =>
        words
          .slice(at + 1)
          .flatMap((other) => (overlaps(word, other) ? [`${word.text} over ${other.text}`] : [])),
      );
      expect(clashes).toEqual([]);
    }
  });
});

describe('a packing list', () => {
  it('holds every name, bag code and the batch code as text, on a page numbered x of y', async () => {
    const snapshot = makeTwoTeams();
    const text = readPdfText(await build(snapshot, 'packing-lists/herons.pdf')).join('\n');
    for (const player of snapshot.teams[1]?.players ?? []) {
      expect(text).toContain(player.name);
      expect(text).toContain(player.bagCode);
    }
    for (const words of [
      'B-07',
      'Tern Estuary Basketball League',
      'page 1 of 1',
      'Holds children’s names',
      '24 pieces',
    ]) {
      expect(text).toContain(words);
    }
  });

  it('keeps long names inside their columns', async () => {
    const pages = readPdfWords(await build(hostile, 'packing-lists/etc-otters-sons.pdf'));
    const first = pages[0]?.words ?? [];
    const head = (text: string) => first.find((word) => word.text === text)?.left ?? NaN;
    const [player, back] = [
      head('Player'),
      first.find((w) => w.text === 'on' && w.left > head('Player'))?.left ?? NaN,
    ];
    const backLeft = first.filter((word) => word.text === 'Name' && word.right < back).at(-1)?.left ?? NaN;
    const names = pages
      .flatMap((page) => page.words)
      .filter((w) => w.left >= player - 0.5 && w.left < backLeft - 4);
    const rows = names.filter((word) => word.text.length > 12);
    expect(rows.length).toBeGreaterThan(5);
    const lists = rows.filter(
      (word) => word.text.startsWith('Overmarsh') || word.text.startsWith('Fernández'),
    );
    for (const word of lists) expect(word.right).toBeLessThanOrEqual(backLeft);
  });

  it('says how many pieces have no size and writes "no size" beside each', async () => {
    const text = readPdfText(await build(makeTwoTeams(), 'packing-lists/otters.pdf')).join('\n');
    expect(text.match(/no size/g)).toHaveLength(4); // two pieces, and one in each of two totals
  });

  it('says on the page which letters are crossed boxes and where the true spelling stands', async () => {
    const pages = readPdfText(await build(hostile, 'packing-lists/etc-otters-sons.pdf'));
    expect(pages.some((page) => page.includes('U+10E5') && page.includes('data/pieces.csv'))).toBe(true);
    expect(pages[0]).not.toContain('crossed box');
  });

  it('is on the paper of the batch', async () => {
    const sizeOf = async (paper: 'A4' | 'Letter') => {
      const [page] = readPdfWords(await build(makeTwoTeams({ paper }), 'packing-lists/otters.pdf'));
      return [page?.width.toFixed(1), page?.height.toFixed(1)];
    };
    expect(await sizeOf('A4')).toEqual(['595.3', '841.9']);
    expect(await sizeOf('Letter')).toEqual(['612.0', '792.0']);
  });
});

describe('bag labels', () => {
  it('hold each drawable name whole, in the order of the batch', async () => {
    const pages = readPdfText(await build(hostile, 'bag-labels.pdf'));
    const players = hostile.teams.flatMap((team) => team.players);
    const plain = (text: string) => text.replace(/[\s\u202a-\u202e]/g, '').normalize('NFKC');
    players.forEach((player, at) => {
      if (/[\p{Script=Georgian}\p{Extended_Pictographic}\p{Script=Arabic}]/u.test(player.name)) return;
      // Where directions mix, the reader gives words in the order of the line: each must be there.
      const parts = /\p{Script=Hebrew}/u.test(player.name) ? player.name.split(/[, ]+/) : [player.name];
      for (const text of parts) expect(plain(pages[at] ?? '')).toContain(plain(tidyText(text)));
    });
    expect(pages).toHaveLength(players.length);
  });

  it('are 4 by 6 inches', async () => {
    const [page] = readPdfWords(await build(makeTwoTeams(), 'bag-labels.pdf'));
    expect([page?.width, page?.height]).toEqual([288, 432]);
  });

  it('go on to a second label when a bag holds more than sixteen pieces', async () => {
    const pages = readPdfText(await build(makeWideBatch('A4'), 'bag-labels.pdf'));
    expect(pages).toHaveLength(90);
    expect(pages[0]).toContain('label 1 of 2');
    expect(pages[1]).toContain('label 2 of 2');
  });
});
