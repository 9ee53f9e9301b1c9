import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { blockHeight, fitBlock, fitBox, fitSize, measureText } from '../text/fit-text';
import { formatDay, formatInstant } from '@/lib/domain/dates/format';
import { isTimeZone } from '@/lib/domain/dates/zone';
import type { Canvas } from './canvas';
import { drawYokeTile, tileHeight } from './draw-yoke-tile';
import { care, damson, dusk, hairline, ink, linen, margin, seam, sheets } from './house-style';
import { PdfFile, type PdfHead } from './pdf-file';
import { writeCodePoints } from '../text/list-drawing-notes';
import type { TypeCase } from '../text/type-case';

type Batch = BatchSnapshot['batch'];

/** What a sheet says at its foot: the document's own name stands left of "page 1 of 3". */
type SheetShape = {
  batch: Batch;
  name: string;
  /** Draws the head of a page, told whether it is the first, and answers where the content starts, in mm. */
  head: (canvas: Canvas, first: boolean) => number;
};

const footHeight = 9;
const noteHeight = 7;

/**
 * A document on sheets of the batch's paper that starts a new page whenever the next thing doesn't fit. `y` is where
 * the next thing goes, in mm from the top.
 */
export class Sheet {
  readonly file: PdfFile;
  canvas: Canvas;
  y = 0;
  readonly left = margin.side;
  readonly right: number;
  readonly bottom: number;
  private readonly size: { width: number; height: number };

  constructor(
    type: TypeCase,
    pdf: PdfHead,
    private readonly shape: SheetShape,
  ) {
    this.file = new PdfFile(type, pdf);
    this.size = sheets[shape.batch.paper];
    this.right = this.size.width - margin.side;
    this.bottom = this.size.height - margin.foot - footHeight - noteHeight;
    this.canvas = this.startPage(true);
  }

  get width(): number {
    return this.right - this.left;
  }

  private startPage(first: boolean): Canvas {
    this.canvas = this.file.addPage(this.size);
    this.y = this.shape.head(this.canvas, first);
    return this.canvas;
  }

  /** Makes room for something `height` mm high: answers true when it took a new page. */
  makeRoom(height: number): boolean {
    if (this.y + height <= this.bottom) return false;
    this.startPage(false);
    return true;
  }

  /** Writes the foot of every page and answers the bytes. */
  save(): Promise<Uint8Array> {
    const pages = this.file.listPages();
    pages.forEach((canvas, at) => this.drawFoot(canvas, at + 1, pages.length));
    return this.file.save();
  }

  private drawFoot(canvas: Canvas, page: number, pages: number): void {
    const { batch, name } = this.shape;
    const y = canvas.height - margin.foot - footHeight;
    drawMissingNote(canvas, { x: this.left, y: y - noteHeight, width: this.width, height: noteHeight });
    canvas.line(this.left, y, this.right, y, seam);
    drawYokeTile(canvas, { x: this.left, y: y + 2.6, width: 5 }, markColours);
    const count = `page ${page} of ${pages}`;
    const base = y + 5.9;
    const right = canvas.text(this.right, base, count, { style: 'strong', size: 8, align: 'right' });
    const released = `Batch ${batch.code}, released ${writeRelease(batch)}`;
    const room = (this.width - right - 7 - 8) / 2;
    const size = fitSize(canvas.type, 'text', released, 8, room);
    canvas.text(this.left + 7, base, released, { style: 'text', size, colour: dusk });
    const block = fitBlock(canvas.type, 'text', name, { size: 8, smallest: 6, width: room, mostLines: 1 });
    const top = base - 1 - blockHeight(block) / 2;
    canvas.block(this.right - right - 3, top, block, { colour: dusk, align: 'right' });
  }
}

// Any year but the reference year is written out: these sheets are read long after.
const noYear = -1;

const writeRelease = ({ releasedAt, timeZone }: Batch): string =>
  formatInstant(new Date(releasedAt), isTimeZone(timeZone) ? timeZone : 'UTC', noYear);

/** The mark of the product: a garment in ink with damson sleeves. */
const markColours = { body: ink, sleeves: damson, number: ink, outline: null };

/**
 * When letters of this page could not be drawn, a sentence that says so and where their true spelling stands, on a
 * sheet also which letters. Made to fit `width` by `height` mm.
 */
export function drawMissingNote(
  canvas: Canvas,
  at: { x: number; y: number; width: number; height: number; brief?: boolean },
): void {
  const letters = [...new Set(canvas.missing)];
  if (letters.length === 0) return;
  const codes = letters.slice(0, 6).map(writeCodePoints).join(', ');
  const more = letters.length > 6 ? ` and ${letters.length - 6} more` : '';
  const which = at.brief ? '' : ` (${codes}${more})`;
  const text = `A crossed box stands for a letter our fonts can’t draw${which}. The true spelling is in data/pieces.csv.`;
  const block = fitBox(canvas.type, 'text', text, {
    size: 7.5,
    width: at.width,
    mostLines: 2,
    height: at.height,
  });
  canvas.block(at.x, at.y, block, { colour: care });
}

type HeadShape = {
  kind: string;
  title: string;
  lines: string[];
  kits: Parameters<typeof drawYokeTile>[2][];
  tileNumber?: string;
};

/** The head of a first page: tiles, title, lines about it, and the batch code set large. Answers where it ends. */
export function drawHead(canvas: Canvas, batch: Batch, head: HeadShape): number {
  const { type } = canvas;
  const right = canvas.width - margin.side;
  const tile = 19;
  let x = margin.side;
  for (const kit of head.kits) {
    drawYokeTile(canvas, { x, y: margin.top, width: tile }, kit, head.tileNumber);
    x += tile + 2;
  }
  if (head.kits.length > 0) x += 3;
  const codeSize = fitSize(type, 'figure', batch.code, 28, 42);
  const codeWidth = Math.max(
    measureText(type, 'figure', batch.code, codeSize),
    measureText(type, 'text', head.kind, 8.5),
  );
  canvas.text(right, margin.top + 3, head.kind, { style: 'text', size: 8.5, colour: dusk, align: 'right' });
  canvas.text(right, margin.top + 12.6, batch.code, { style: 'figure', size: codeSize, align: 'right' });
  const width = right - x - codeWidth - 6;
  const title = fitBlock(type, 'strong', head.title, { size: 21, smallest: 12, width, mostLines: 1 });
  let y = margin.top - 1 + canvas.block(x, margin.top - 1, title) + 0.6;
  for (const line of head.lines.filter(Boolean)) {
    const block = fitBlock(type, 'text', line, { size: 9.5, smallest: 8, width, mostLines: 2 });
    y += canvas.block(x, y, block, { colour: dusk });
  }
  return Math.max(y, margin.top + (head.kits.length > 0 ? tileHeight(tile) : 14)) + 4;
}

/** The head of a page that goes on from another: one line and a rule. */
export function drawNextHead(canvas: Canvas, batch: Batch, title: string): number {
  const right = canvas.width - margin.side;
  const base = margin.top + 4.5;
  const code = fitSize(canvas.type, 'figure', batch.code, 15, 42);
  canvas.text(right, base, batch.code, { style: 'figure', size: code, align: 'right' });
  const text = `${title}, continued`;
  const width = right - margin.side - 46;
  const block = fitBlock(canvas.type, 'strong', text, { size: 11, smallest: 8, width, mostLines: 1 });
  return Math.max(margin.top + canvas.block(margin.side, margin.top, block), base) + 3;
}

/** A figure under its words; `blank` leaves "__ of __" to be filled in with a pen. */
export type Fact = { label: string; value: string; colour?: string } | { label: string; blank: true };

/** Facts side by side between hairlines. Answers where the strip ends. */
export function drawFacts(canvas: Canvas, y: number, facts: readonly Fact[]): number {
  const left = margin.side;
  const width = canvas.width - 2 * margin.side;
  const cell = width / facts.length;
  const height = 15;
  canvas.card(left, y, width, height, 2.2, { stroke: hairline });
  facts.forEach((fact, at) => {
    const x = left + cell * at;
    if (at > 0) canvas.line(x, y, x, y + height, hairline);
    const label = fitSize(canvas.type, 'text', fact.label, 8, cell - 6);
    canvas.text(x + 3.2, y + 4.8, fact.label, { style: 'text', size: label, colour: dusk });
    const base = y + 12;
    if ('blank' in fact) {
      const line = { colour: ink, width: 0.25 };
      canvas.line(x + 3.2, base, x + 12, base, line);
      canvas.text(x + 15, base, 'of', { style: 'text', size: 9.5, align: 'centre' });
      canvas.line(x + 18, base, x + 27, base, line);
      return;
    }
    const size = fitSize(canvas.type, 'figure', fact.value, 19, cell - 6);
    canvas.text(x + 3.2, base, fact.value, { style: 'figure', size, colour: fact.colour ?? ink });
  });
  return y + height + 5;
}

/** A quiet panel with a caution: a triangle and a sentence. Answers where it ends. */
export function drawCaution(canvas: Canvas, y: number, text: string): number {
  const left = margin.side;
  const width = canvas.width - 2 * margin.side;
  const block = fitBlock(canvas.type, 'text', text, {
    size: 8.5,
    smallest: 7,
    width: width - 13,
    mostLines: 2,
    leading: 1.3,
  });
  const height = blockHeight(block) + 3;
  canvas.card(left, y, width, height, 1.8, { fill: linen });
  drawTriangle(canvas, left + 3, y + height / 2 - 1.7, 3.4);
  canvas.block(left + 9, y + 1.6, block);
  return y + height + 4;
}

/** The mark of a caution: a triangle with a bar and a dot, `size` mm high. */
function drawTriangle(canvas: Canvas, x: number, y: number, size: number): void {
  const width = size * 1.12;
  canvas.path([['M', x + width / 2, y], ['L', x + width, y + size], ['L', x, y + size], ['Z']], {
    fill: care,
    stroke: { colour: care, width: size * 0.12 },
  });
  const middle = x + width / 2;
  canvas.rect(middle - size * 0.06, y + size * 0.34, size * 0.12, size * 0.3, { fill: '#ffffff' });
  canvas.rect(middle - size * 0.06, y + size * 0.74, size * 0.12, size * 0.12, { fill: '#ffffff' });
}

/** "Tern Estuary Basketball League, Autumn 2027". */
export const describeLeague = (batch: Batch): string => `${batch.league}, ${batch.season}`;

/** "For Quay Street Press Room, promised for Friday 2 October 2027". */
export const describeShop = (batch: Batch): string =>
  `For ${batch.shop}, ${batch.promisedOn === null ? 'no day promised' : `promised for ${formatDay(batch.promisedOn, noYear)}`}`;
