import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { contrastRatio } from '@/lib/domain/colour/contrast-ratio';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import {
  pullDigits,
  sixAndNineNote,
  type CharacterCount,
  type DigitPull,
} from '@/lib/domain/packing/pull-digits';
import { countOf } from '@/lib/domain/text/count-of';
import { blockHeight, fitBlock, fitSize } from '../text/fit-text';
import type { TypeCase } from '../text/type-case';
import { care, dusk, hairline, ink, thread, tickBox } from './house-style';
import { describeLeague, describeShop, drawCaution, drawFacts, drawHead, drawNextHead, Sheet } from './sheet';

const perRow = 5;
const gap = 3;
const cardHeight = 19;

/**
 * The list to take digits by: for every number colour with its outline a card for each digit from 0 to 9, drawn in that
 * colour, with how many to take. Letters of labels that are not digits only follow on cards of their own.
 */
export function buildDigitPullList(snapshot: BatchSnapshot, type: TypeCase): Promise<Uint8Array> {
  const { batch } = snapshot;
  const pulls = pullDigits(listPieces(snapshot));
  const sum = (of: (pull: DigitPull) => number) => pulls.reduce((total, pull) => total + of(pull), 0);
  const without = sum((pull) => pull.withoutNumber);
  const title = 'Digits to pull';
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
        const facts = drawFacts(canvas, y, [
          { label: 'Digits', value: String(sum((pull) => pull.total)) },
          { label: 'Numbered pieces', value: String(sum((pull) => pull.pieces)) },
          { label: 'Number colours', value: String(pulls.length) },
          { label: 'Pieces without a number', value: String(without), ...(without > 0 && { colour: care }) },
        ]);
        return drawCaution(canvas, facts, sixAndNineNote);
      },
    },
  );
  for (const pull of pulls) drawColour(sheet, pull);
  if (pulls.length === 0) {
    sheet.canvas.text(sheet.left, sheet.y + 5, 'No piece in this batch has a number.', {
      style: 'text',
      size: 10,
    });
  }
  return sheet.save();
}

function drawColour(sheet: Sheet, pull: DigitPull): void {
  const { type } = sheet.canvas;
  const title = pull.outline === null ? `${pull.number}, no outline` : `${pull.number} on ${pull.outline}`;
  const wearers = pull.wornBy
    .map(({ team, kitKind, colour }) => `${team}, ${kitKind} (${colour})`)
    .join('; ');
  const counts = `${countOf(pull.total, 'digit')} for ${countOf(pull.pieces, 'piece')}`;
  const without =
    pull.withoutNumber > 0 ? `, ${countOf(pull.withoutNumber, 'piece')} still without a number` : '';
  const worn = fitBlock(type, 'text', `${counts}${without}. Worn by ${wearers}.`, {
    size: 9,
    smallest: 8,
    width: sheet.width - 34,
    mostLines: 2,
    leading: 1.3,
  });
  sheet.makeRoom(Math.min(150, 12 + blockHeight(worn) + 2 * (cardHeight + gap)));
  const { canvas } = sheet;
  drawSwatch(sheet, pull);
  canvas.text(sheet.left + 16, sheet.y + 5, title, { style: 'strong', size: 13 });
  const total = { style: 'figure', size: 20, align: 'right' } as const;
  canvas.text(sheet.right, sheet.y + 6.4, String(pull.total), total);
  // A league may have so many teams in one colour that their names need more than a page.
  let top = sheet.y + 7;
  for (const line of worn.lines) {
    if (top + worn.leading > sheet.bottom) {
      sheet.makeRoom(sheet.bottom);
      top = sheet.y;
    }
    sheet.canvas.block(sheet.left + 16, top, { ...worn, lines: [line] }, { colour: dusk });
    top += worn.leading;
  }
  sheet.y = Math.max(sheet.y + 13, top + 2.5);
  drawCards(sheet, pull, pull.digits);
  if (pull.others.length > 0) {
    sheet.makeRoom(cardHeight + gap + 7);
    sheet.canvas.text(sheet.left, sheet.y + 3.5, 'Letters and other characters', {
      style: 'strong',
      size: 9.5,
    });
    sheet.y += 6;
    drawCards(sheet, pull, pull.others);
  }
  sheet.y += 5;
}

/** Two squares show the number's colour on its outline's. */
function drawSwatch(sheet: Sheet, pull: DigitPull): void {
  const stroke = { colour: thread, width: 0.25 };
  const { canvas, left, y } = sheet;
  canvas.card(left, y, 12, 10, 1.6, { fill: pull.outline ?? '#ffffff', stroke });
  canvas.card(left + 2, y + 2, 8, 6, 0.8, { fill: pull.number, stroke });
}

function drawCards(sheet: Sheet, pull: DigitPull, counts: readonly CharacterCount[]): void {
  const width = (sheet.width - (perRow - 1) * gap) / perRow;
  for (let at = 0; at < counts.length; at += perRow) {
    sheet.makeRoom(cardHeight + gap);
    counts.slice(at, at + perRow).forEach((entry, column) => {
      drawCard(sheet, pull, entry, { x: sheet.left + column * (width + gap), y: sheet.y, width });
    });
    sheet.y += cardHeight + gap;
  }
}

function drawCard(
  sheet: Sheet,
  pull: DigitPull,
  { character, count }: CharacterCount,
  at: { x: number; y: number; width: number },
): void {
  const { canvas } = sheet;
  const idle = count === 0;
  canvas.card(at.x, at.y, at.width, cardHeight, 2.2, { stroke: hairline });
  const size = fitSize(canvas.type, 'figure', character, 40, at.width / 2 - 4);
  canvas.text(at.x + at.width * 0.29, at.y + 14.4, character, {
    style: 'figure',
    size,
    colour: idle ? hairline.colour : pull.number,
    align: 'centre',
    outline: idle ? undefined : chooseOutline(pull),
  });
  const right = at.x + at.width - 3.2;
  const figure = fitSize(canvas.type, 'figure', String(count), 22, at.width / 2 - 4);
  const paint = { style: 'figure', size: figure, colour: idle ? thread : ink, align: 'right' } as const;
  canvas.text(right, at.y + 9.4, String(count), paint);
  if (idle) return;
  canvas.rect(right - 3.2, at.y + 12.6, 3.2, 3.2, { stroke: tickBox });
  canvas.text(right - 4.6, at.y + 15.2, 'taken', { style: 'text', size: 7.5, colour: dusk, align: 'right' });
}

/** The kit's outline as it will look; without one a dark line keeps a light digit in sight on white paper. */
function chooseOutline(pull: DigitPull): { colour: string; width: number } | undefined {
  if (pull.outline !== null) return { colour: pull.outline, width: 1.5 };
  // The least contrast of anything that is not text (WCAG 2.2, 1.4.11).
  return contrastRatio(pull.number, '#ffffff') < 3 ? { colour: dusk, width: 0.6 } : undefined;
}
