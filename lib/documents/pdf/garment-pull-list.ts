import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { listPieces, noSize } from '@/lib/domain/packing/list-pieces';
import { pullGarments, type ColourPull, type GarmentPull } from '@/lib/domain/packing/pull-garments';
import { blockHeight, fitBlock, fitSize } from '../text/fit-text';
import type { TypeCase } from '../text/type-case';
import { drawYokeTile } from './draw-yoke-tile';
import { care, dusk, hairline, ink, rule, thread, tickBox } from './house-style';
import { describeLeague, describeShop, drawFacts, drawHead, drawNextHead, Sheet } from './sheet';

const nameWidth = 44;
const sizesPerBand = 9;

/**
 * The list to take garments from the shelf by: for every style a table with a row for each colour and a column for
 * each size, in the order of the run, with totals both ways and a box to tick in every cell. Sizes that don't fit side
 * by side go on in a second band.
 */
export function buildGarmentPullList(snapshot: BatchSnapshot, type: TypeCase): Promise<Uint8Array> {
  const { batch } = snapshot;
  const pieces = listPieces(snapshot);
  const pulls = pullGarments(pieces);
  const without = pieces.filter((piece) => piece.size === '').length;
  const title = 'Garments to pull';
  const sheet = new Sheet(
    type,
    { title: `${title}, batch ${batch.code}`, subject: describeLeague(batch), releasedAt: batch.releasedAt },
    {
      batch,
      name: title,
      head: (canvas, first) => {
        if (!first) return drawNextHead(canvas, batch, title);
        const lines = [describeLeague(batch), describeShop(batch)];
        const y = drawHead(canvas, batch, { kind: 'Pull list, batch', title, lines, kits: [] });
        return drawFacts(canvas, y, [
          { label: 'Pieces', value: String(pieces.length) },
          { label: 'Styles', value: String(pulls.length) },
          { label: 'Teams', value: String(snapshot.teams.length) },
          { label: 'Pieces without a size', value: String(without), ...(without > 0 && { colour: care }) },
        ]);
      },
    },
  );
  for (const pull of pulls) drawStyle(sheet, pull);
  if (pulls.length === 0) {
    sheet.canvas.text(sheet.left, sheet.y + 5, 'No garments are in this batch.', { style: 'text', size: 10 });
  }
  return sheet.save();
}

function drawStyle(sheet: Sheet, pull: GarmentPull): void {
  const { type } = sheet.canvas;
  const title = fitBlock(type, 'strong', pull.style, {
    size: 14,
    smallest: 10,
    width: sheet.width - 40,
    mostLines: 1,
  });
  sheet.makeRoom(blockHeight(title) + 32);
  sheet.y += 2;
  const height = sheet.canvas.block(sheet.left, sheet.y, title);
  const total = { style: 'figure', size: 20, align: 'right' } as const;
  sheet.canvas.text(sheet.right, sheet.y + 6, String(pull.total), total);
  sheet.y += Math.max(height, 7) + 1;
  const bands = Math.max(1, Math.ceil(pull.sizes.length / sizesPerBand));
  for (let band = 0; band < bands; band += 1) {
    drawBand(sheet, pull, band * sizesPerBand, band === bands - 1);
  }
  sheet.y += 6;
}

/** One band of a style: up to nine sizes from `first` on; only the last band shows the totals of the rows. */
function drawBand(sheet: Sheet, pull: GarmentPull, first: number, isLast: boolean): void {
  const sizes = pull.sizes.slice(first, first + sizesPerBand);
  const from = sheet.left + nameWidth + 3;
  const to = sheet.right - 18;
  const cell = Math.min(17, (to - from) / Math.max(1, sizes.length));
  const drawColumns = () => drawSizes(sheet, sizes, from, cell, isLast);
  sheet.makeRoom(24);
  drawColumns();
  for (const colour of pull.colours) {
    const height = heightOfColour(sheet, colour);
    if (sheet.makeRoom(height)) drawColumns();
    drawColour(sheet, colour, sizes, { from, cell, height, isLast });
  }
  if (pull.colours.length < 2) return;
  if (sheet.makeRoom(9)) drawColumns();
  const base = sheet.y + 6;
  sheet.canvas.text(sheet.left, base, 'All colours', { style: 'strong', size: 9.5 });
  sizes.forEach((size, at) => {
    const count = pull.colours.reduce((sum, colour) => sum + countOfSize(colour, size.code), 0);
    const x = from + (at + 0.5) * cell;
    sheet.canvas.text(x, base, String(count), { style: 'figure', size: 13, colour: dusk, align: 'centre' });
  });
  if (isLast) {
    const total = String(pull.total);
    sheet.canvas.text(sheet.right, base, total, { style: 'figure', size: 15, align: 'right' });
  }
  sheet.y += 9;
}

function drawSizes(
  sheet: Sheet,
  sizes: GarmentPull['sizes'],
  from: number,
  cell: number,
  isLast: boolean,
): void {
  const { canvas } = sheet;
  const blocks = sizes.map((size) =>
    fitBlock(canvas.type, 'text', size.code === '' ? noSize : size.code, {
      size: 9,
      smallest: 6,
      width: cell - 1.5,
      mostLines: 1,
      leading: 1.1,
    }),
  );
  const height = Math.max(4.5, ...blocks.map(blockHeight)) + 1;
  blocks.forEach((block, at) => {
    const colour = sizes[at]?.known ? dusk : care;
    const top = sheet.y + height - blockHeight(block) - 0.8;
    canvas.block(from + (at + 0.5) * cell, top, block, { colour, align: 'centre' });
  });
  const label = { style: 'text', size: 8.5, colour: dusk } as const;
  canvas.text(sheet.left, sheet.y + height - 1.8, 'Colour', label);
  if (isLast) canvas.text(sheet.right, sheet.y + height - 1.8, 'All', { ...label, align: 'right' });
  sheet.y += height;
  canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, rule);
}

const setColourName = (sheet: Sheet, colour: ColourPull) =>
  fitBlock(sheet.canvas.type, 'strong', colour.colour, {
    size: 9.5,
    smallest: 7.5,
    width: nameWidth - 14,
    mostLines: 2,
  });

const heightOfColour = (sheet: Sheet, colour: ColourPull): number =>
  Math.max(13.5, blockHeight(setColourName(sheet, colour)) + 8);

function drawColour(
  sheet: Sheet,
  colour: ColourPull,
  sizes: GarmentPull['sizes'],
  at: { from: number; cell: number; height: number; isLast: boolean },
): void {
  const { canvas, y } = sheet;
  const middle = y + at.height / 2;
  const kit = { body: colour.body, sleeves: colour.sleeves, number: colour.body, outline: null };
  drawYokeTile(canvas, { x: sheet.left, y: middle - 4.8, width: 11 }, kit);
  const name = setColourName(sheet, colour);
  const top = middle - (blockHeight(name) + 3.2) / 2;
  canvas.block(sheet.left + 14, top, name);
  const codes = colour.body === colour.sleeves ? colour.body : `${colour.body} ${colour.sleeves}`;
  const base = top + blockHeight(name) + 2.6;
  canvas.text(sheet.left + 14, base, codes, { style: 'code', size: 7, colour: dusk });
  sizes.forEach((size, index) => {
    const x = at.from + (index + 0.5) * at.cell;
    const count = countOfSize(colour, size.code);
    if (count === 0) {
      canvas.line(x - 1, middle, x + 1, middle, { colour: thread, width: 0.3 });
      return;
    }
    const figure = fitSize(canvas.type, 'figure', String(count), 17, at.cell - 6.5);
    canvas.rect(x - 4.6, middle - 1.6, 3.2, 3.2, { stroke: tickBox });
    const paint = { style: 'figure', size: figure, colour: size.code === '' ? care : ink } as const;
    canvas.text(x + 0.2, middle + 2.05, String(count), paint);
  });
  if (at.isLast) {
    const total = { style: 'figure', size: 17, align: 'right' } as const;
    canvas.text(sheet.right, middle + 2.05, String(colour.total), total);
  }
  sheet.y += at.height;
  canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, hairline);
}

const countOfSize = (colour: ColourPull, code: string): number =>
  colour.sizes.find((size) => size.code === code)?.count ?? 0;
