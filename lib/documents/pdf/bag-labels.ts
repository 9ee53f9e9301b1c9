import type { BatchSnapshot, SnapshotPlayer, SnapshotTeam } from '@/lib/domain/batch/batch-snapshot';
import { listPlayerPieces, noSize, type Piece } from '@/lib/domain/packing/list-pieces';
import { blockHeight, blockWidth, fitBox, fitSize, mmPerPoint } from '../text/fit-text';
import type { TypeCase } from '../text/type-case';
import type { Canvas } from './canvas';
import { drawQrCode, quietModules } from './draw-qr-code';
import { drawYokeTile } from './draw-yoke-tile';
import { care, dusk, ink, labelSize, seam, tickBox } from './house-style';
import { PdfFile } from './pdf-file';
import { describeLeague, drawMissingNote } from './sheet';

const edge = 6;
const right = labelSize.width - edge;
const inner = labelSize.width - 2 * edge;

/** The code is 30 mm wide: 21 modules of 1.4 mm, 17 dots each at 300 dpi, with white all round. */
const codeWidth = 30;
const codeLeft = right - codeWidth;
const quiet = (codeWidth / 21) * quietModules;
const piecesPerLabel = 16;

/** Saira's capitals and digits are 0.688 em high. */
const figureHeight = 0.688;

/** How many labels a batch needs: one a player, and another for every sixteen pieces more. */
export const countBagLabels = (snapshot: BatchSnapshot): number =>
  listLabels(snapshot).reduce((sum, label) => sum + label.parts.length, 0);

type Label = { team: SnapshotTeam; player: SnapshotPlayer; parts: Piece[][] };

function listLabels(snapshot: BatchSnapshot): Label[] {
  return snapshot.teams.flatMap((team) =>
    team.players.map((player) => {
      const pieces = listPlayerPieces(team, player);
      const count = Math.max(1, Math.ceil(pieces.length / piecesPerLabel));
      const parts = Array.from({ length: count }, (_, at) =>
        pieces.slice(at * piecesPerLabel, (at + 1) * piecesPerLabel),
      );
      return { team, player, parts };
    }),
  );
}

/**
 * A label of 4 by 6 inches for every bag, teams and players in the order of the batch: the number as worn, the name,
 * what lies in the bag in which size, and the bag code as QR (level M) and in letters. Everything is made to fit its
 * place on the label. `onLabel` is told how many are drawn and is waited for.
 */
export async function buildBagLabels(
  snapshot: BatchSnapshot,
  type: TypeCase,
  onLabel: (done: number) => void | Promise<void> = () => {},
): Promise<Uint8Array> {
  const { batch } = snapshot;
  const file = new PdfFile(type, {
    title: `Bag labels, batch ${batch.code}`,
    subject: describeLeague(batch),
    releasedAt: batch.releasedAt,
  });
  for (const label of listLabels(snapshot)) {
    for (const [at, pieces] of label.parts.entries()) {
      drawLabel(file.addPage(labelSize), batch, label, pieces, at);
      await onLabel(file.pageCount);
    }
  }
  if (file.pageCount === 0) {
    const canvas = file.addPage(labelSize);
    canvas.text(edge, 20, 'No players are in this batch.', { style: 'text', size: 11 });
  }
  return file.save();
}

function drawLabel(
  canvas: Canvas,
  batch: BatchSnapshot['batch'],
  label: Label,
  pieces: readonly Piece[],
  part: number,
): void {
  drawTeam(canvas, label);
  drawNumber(canvas, label.player);
  drawCode(canvas, label.player);
  const y = drawName(canvas, label.player);
  canvas.line(edge, y, right, y, seam);
  drawPieces(canvas, pieces, y + 3, 136);
  canvas.line(edge, 137.5, right, 137.5, seam);
  drawBatch(canvas, batch, label.parts.length > 1 ? `label ${part + 1} of ${label.parts.length}` : '');
  drawMissingNote(canvas, { x: edge, y: 145.8, width: inner, height: 5, brief: true });
}

function drawTeam(canvas: Canvas, { team }: Label): void {
  drawYokeTile(canvas, { x: edge, y: edge + 0.5, width: 18 }, team.kits.home);
  const x = edge + 22;
  const width = right - x;
  const name = fitBox(canvas.type, 'strong', team.name, {
    size: 17,
    width,
    mostLines: 3,
    height: 11.5,
    leading: 1.15,
  });
  const division = fitBox(canvas.type, 'text', team.division, { size: 10, width, mostLines: 2, height: 6 });
  const y = edge + (16.5 - blockHeight(name) - blockHeight(division)) / 2;
  canvas.block(x, y, name);
  canvas.block(x, y + blockHeight(name), division, { colour: dusk });
  canvas.line(edge, 26, right, 26, seam);
}

/** The number as tall as the code beside it, narrower only when it has more than two characters. */
function drawNumber(canvas: Canvas, player: SnapshotPlayer): void {
  const width = codeLeft - quiet - 1 - edge;
  const number = player.number.trim();
  if (number === '') {
    canvas.text(edge, 50, 'no number', { style: 'strong', size: 17, colour: care });
    return;
  }
  const size = fitSize(canvas.type, 'figure', number, 44 / figureHeight / mmPerPoint, width);
  const base = 31 + 22 + (size * mmPerPoint * figureHeight) / 2;
  canvas.text(edge - 0.5, base, number, { style: 'figure', size });
}

function drawCode(canvas: Canvas, player: SnapshotPlayer): void {
  drawQrCode(canvas, { x: codeLeft, y: 32, width: codeWidth }, player.bagCode);
  const size = fitSize(canvas.type, 'code', player.bagCode, 15, codeWidth);
  canvas.text(codeLeft + codeWidth / 2, 62 + quiet + 4, player.bagCode, {
    style: 'code',
    size,
    align: 'centre',
  });
}

/** The name in up to four lines and under it the name as pressed. Answers where the next part starts. */
function drawName(canvas: Canvas, player: SnapshotPlayer): number {
  const name = fitBox(canvas.type, 'strong', player.name, {
    size: 20,
    width: inner,
    mostLines: 4,
    height: 15,
  });
  canvas.block(edge, 78.5, name);
  const y = 78.5 + blockHeight(name) + 0.5;
  const back = fitBox(canvas.type, 'code', player.nameOnBack, {
    size: 12,
    width: inner,
    mostLines: 2,
    height: 7,
  });
  canvas.block(edge, y, back, { colour: dusk });
  return y + blockHeight(back) + 3.5;
}

/** The pieces in two columns between `top` and `bottom`, rows only as high as there is room. */
function drawPieces(canvas: Canvas, pieces: readonly Piece[], top: number, bottom: number): void {
  const columns = pieces.length > 3 ? 2 : 1;
  const rows = Math.ceil(pieces.length / columns);
  const height = Math.min(9, (bottom - top) / Math.max(1, rows));
  const width = (inner - (columns - 1) * 5) / columns;
  pieces.forEach((piece, at) => {
    const x = edge + Math.floor(at / rows) * (width + 5);
    const middle = top + ((at % rows) + 0.5) * height;
    const box = Math.min(3.8, height * 0.6);
    canvas.rect(x, middle - box / 2, box, box, { stroke: tickBox });
    const size = fitBox(canvas.type, 'strong', piece.size === '' ? noSize : piece.size, {
      size: 14,
      width: width * 0.42,
      mostLines: 2,
      height: height * 0.9,
      leading: 1.1,
    });
    const sizeColour = piece.size === '' ? care : ink;
    canvas.block(x + width, middle - blockHeight(size) / 2, size, { colour: sizeColour, align: 'right' });
    const name = fitBox(canvas.type, 'text', `${piece.garment.name}, ${piece.kitKind}`, {
      size: 10.5,
      width: width - blockWidth(size) - box - 5,
      mostLines: 3,
      height: height * 0.95,
      leading: 1.1,
    });
    canvas.block(x + box + 2, middle - blockHeight(name) / 2, name);
  });
}

function drawBatch(canvas: Canvas, batch: BatchSnapshot['batch'], part: string): void {
  const size = fitSize(canvas.type, 'figure', batch.code, 16, 40);
  const width = canvas.text(right, 144, batch.code, { style: 'figure', size, align: 'right' });
  const text = [describeLeague(batch), part].filter(Boolean).join(', ');
  const block = fitBox(canvas.type, 'text', text, {
    size: 8.5,
    width: inner - width - 4,
    mostLines: 2,
    height: 6.5,
  });
  canvas.block(edge, 142.2 - blockHeight(block) / 2, block, { colour: dusk });
}
