import type { BatchSnapshot, SnapshotPlayer, SnapshotTeam } from '@/lib/domain/batch/batch-snapshot';
import type { Kit, KitKind } from '@/lib/domain/kit/kit';
import { listKitsOfGarment, listPlayerPieces, noSize, type Piece } from '@/lib/domain/packing/list-pieces';
import { pullGarments } from '@/lib/domain/packing/pull-garments';
import type { Garment } from '@/lib/domain/roster/player';
import { countOf } from '@/lib/domain/text/count-of';
import { blockHeight, fitBlock, fitSize, measureText, type TextBlock } from '../text/fit-text';
import type { TypeCase } from '../text/type-case';
import { care, dusk, hairline, ink, rule, seam, tickBox } from './house-style';
import { describeLeague, describeShop, drawCaution, drawFacts, drawHead, drawNextHead, Sheet } from './sheet';

/** In our own words: the usual care for pages with children's names. */
const privacyNote =
  'Holds children’s names. Keep it with the cartons: don’t post it or pin it up, and shred it once the kit is handed out.';

/** One kind of piece that every player of the team gets: a garment in one kit. */
type PieceColumn = { garment: Garment; kind: KitKind; kit: Kit };

type Columns = {
  tick: number;
  number: number;
  player: number;
  playerWidth: number;
  back: number;
  backWidth: number;
  pieces: number;
  pieceWidth: number;
  perLine: number;
  code: number;
};

/**
 * The packing list of a team: who gets what in which size, with a box to tick for every piece and bag, then the totals
 * by size and a line to sign. Long names wrap; nothing is cut. `onRow` is told how many players are drawn.
 */
export async function buildPackingList(
  snapshot: BatchSnapshot,
  team: SnapshotTeam,
  type: TypeCase,
  onRow: (done: number) => void | Promise<void> = () => {},
): Promise<Uint8Array> {
  const { batch } = snapshot;
  const columns = team.garments.flatMap((garment) =>
    listKitsOfGarment(team, garment).map(({ kind, kit }) => ({ garment, kind, kit })),
  );
  const pieces = team.players.flatMap((player) => listPlayerPieces(team, player));
  const sheet: Sheet = new Sheet(
    type,
    {
      title: `Packing list, ${team.name}`,
      subject: `Batch ${batch.code}, ${describeLeague(batch)}`,
      releasedAt: batch.releasedAt,
    },
    {
      batch,
      name: `Packing list, ${team.name}`,
      head: (canvas, first) => {
        if (!first) return drawNextHead(canvas, batch, `Packing list, ${team.name}`);
        const kits = [team.kits.home, ...(team.kits.away ? [team.kits.away] : [])];
        const lines = [team.division, describeLeague(batch), describeShop(batch)];
        const number = team.players.find((player) => player.number.trim() !== '')?.number.trim() ?? '';
        const y = drawHead(canvas, batch, {
          kind: 'Packing list, batch',
          title: team.name,
          lines,
          kits,
          tileNumber: number,
        });
        return drawCaution(canvas, drawFacts(canvas, y, listFacts(team, pieces)), privacyNote);
      },
    },
  );
  const layout = layColumns(type, sheet, columns);
  drawTableHead(sheet, columns, layout);
  for (const [at, player] of team.players.entries()) {
    const row = setRow(type, team, player, columns, layout);
    if (sheet.makeRoom(row.height)) drawTableHead(sheet, columns, layout);
    drawRow(sheet, row, layout);
    await onRow(at + 1);
  }
  if (team.players.length === 0) {
    sheet.canvas.text(sheet.left, sheet.y + 7, 'No players are on this roster.', { style: 'text', size: 10 });
    sheet.y += 12;
  }
  drawTotals(sheet, pieces);
  drawSignature(sheet);
  return sheet.save();
}

function listFacts(team: SnapshotTeam, pieces: readonly Piece[]) {
  const without = pieces.filter((piece) => piece.size === '').length;
  return [
    { label: team.players.length === 1 ? 'Bag' : 'Bags', value: String(team.players.length) },
    { label: pieces.length === 1 ? 'Piece' : 'Pieces', value: String(pieces.length) },
    { label: 'Pieces without a size', value: String(without), ...(without > 0 && { colour: care }) },
    { label: 'Carton', blank: true } as const,
  ];
}

/** Widths in mm: what the piece columns leave goes to the two names. */
function layColumns(type: TypeCase, sheet: Sheet, columns: readonly PieceColumn[]): Columns {
  const named = columns.some(({ garment }) => garment.named);
  const codeWidth = measureText(type, 'code', '7F3K-92QD', 8.5) + 1;
  const number = sheet.left + 20;
  const player = number + 4;
  const code = sheet.right;
  const free = code - codeWidth - player - 4;
  const narrowest = 17;
  const most = Math.max(1, Math.floor((free - (named ? 66 : 40)) / narrowest));
  const lines = Math.max(1, Math.ceil(columns.length / most));
  const perLine = Math.max(1, Math.ceil(columns.length / lines));
  const pieceWidth = Math.min(24, Math.max(narrowest, (free - (named ? 84 : 56)) / perLine));
  const names = free - perLine * pieceWidth - 2;
  const playerWidth = named ? names * 0.55 - 2 : names - 2;
  return {
    tick: sheet.left,
    number,
    player,
    playerWidth,
    back: player + playerWidth + 2,
    backWidth: named ? names - playerWidth - 4 : 0,
    pieces: player + names + 2,
    pieceWidth,
    perLine,
    code,
  };
}

function drawTableHead(sheet: Sheet, columns: readonly PieceColumn[], at: Columns): void {
  const { canvas } = sheet;
  const { type } = canvas;
  const heads = columns.map(({ garment, kind }) => ({
    name: fitBlock(type, 'strong', garment.name, {
      size: 8,
      smallest: 6,
      width: at.pieceWidth - 2,
      mostLines: 2,
      leading: 1.15,
    }),
    kind: fitBlock(type, 'text', kind, { size: 7.5, smallest: 7.5, width: at.pieceWidth - 2, mostLines: 1 }),
  }));
  const heightOf = (head: (typeof heads)[number]) => blockHeight(head.name) + blockHeight(head.kind) + 1;
  const lines = chunk(heads, at.perLine);
  const heights = lines.map((line) => Math.max(0, ...line.map(heightOf)));
  const height = Math.max(6, sum(heights)) + 1;
  // A head is never left alone at the foot of a page.
  sheet.makeRoom(height + 12);
  let y = sheet.y;
  lines.forEach((line, lineAt) => {
    const lineHeight = heights[lineAt] ?? 0;
    line.forEach((head, column) => {
      const x = at.pieces + column * at.pieceWidth;
      const top = y + lineHeight - heightOf(head);
      sheet.canvas.block(x, top + blockHeight(head.name), head.kind, { colour: dusk });
      sheet.canvas.block(x, top, head.name);
    });
    y += lineHeight;
  });
  const base = sheet.y + height - 2.6;
  const label = { style: 'text', size: 8, colour: dusk } as const;
  sheet.canvas.text(at.tick, base, 'Bag', label);
  sheet.canvas.text(at.number, base, 'No.', { ...label, align: 'right' });
  sheet.canvas.text(at.player, base, 'Player', label);
  if (at.backWidth > 0) sheet.canvas.text(at.back, base, 'Name on back', label);
  sheet.canvas.text(at.code, base, 'Bag code', { ...label, align: 'right' });
  sheet.y += height;
  sheet.canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, rule);
}

type Row = {
  player: SnapshotPlayer;
  number: TextBlock;
  name: TextBlock;
  back: TextBlock;
  cells: { size: string; text: TextBlock }[][];
  lineHeights: number[];
  height: number;
};

function setRow(
  type: TypeCase,
  team: SnapshotTeam,
  player: SnapshotPlayer,
  columns: readonly PieceColumn[],
  at: Columns,
): Row {
  const name = fitBlock(type, 'text', player.name, {
    size: 10,
    smallest: 7.5,
    width: at.playerWidth,
    mostLines: 2,
  });
  const hasNumber = player.number.trim() !== '';
  const number = fitBlock(type, hasNumber ? 'figure' : 'text', hasNumber ? player.number : 'none', {
    size: hasNumber ? 15 : 8,
    smallest: 8,
    width: 14,
    mostLines: 1,
    leading: 1.1,
  });
  const back = fitBlock(type, 'code', player.nameOnBack, {
    size: 9,
    smallest: 7,
    width: Math.max(10, at.backWidth),
    mostLines: 2,
  });
  const bySize = listPlayerPieces(team, player);
  const cells = columns.map((_, index) => {
    const size = bySize[index]?.size ?? '';
    const text = fitBlock(type, size === '' ? 'text' : 'strong', size === '' ? noSize : size, {
      size: size === '' ? 8 : 9.5,
      smallest: 6,
      width: at.pieceWidth - 6.5,
      mostLines: 1,
    });
    return { size, text };
  });
  const lines = chunk(cells, at.perLine);
  const lineHeights = lines.map((line) => Math.max(6, ...line.map((cell) => blockHeight(cell.text) + 1.4)));
  const names =
    Math.max(blockHeight(name), blockHeight(number), at.backWidth > 0 ? blockHeight(back) : 0) + 2.4;
  return {
    player,
    number,
    name,
    back,
    cells: lines,
    lineHeights,
    height: Math.max(7.6, names, sum(lineHeights) + 1.6),
  };
}

function drawRow(sheet: Sheet, row: Row, at: Columns): void {
  const { canvas, y } = sheet;
  const middle = y + row.height / 2;
  const centred = (block: TextBlock) => middle - blockHeight(block) / 2;
  canvas.rect(at.tick + 0.4, middle - 1.9, 3.8, 3.8, { stroke: tickBox });
  const numberColour = row.player.number.trim() === '' ? care : ink;
  canvas.block(at.number, centred(row.number), row.number, { align: 'right', colour: numberColour });
  canvas.block(at.player, centred(row.name), row.name);
  if (at.backWidth > 0) canvas.block(at.back, centred(row.back), row.back);
  let top = middle - sum(row.lineHeights) / 2;
  row.cells.forEach((line, lineAt) => {
    const height = row.lineHeights[lineAt] ?? 0;
    line.forEach((cell, column) => {
      const x = at.pieces + column * at.pieceWidth;
      canvas.rect(x, top + height / 2 - 1.6, 3.2, 3.2, { stroke: tickBox });
      canvas.block(x + 4.6, top + height / 2 - blockHeight(cell.text) / 2, cell.text, {
        colour: cell.size === '' ? care : ink,
      });
    });
    top += height;
  });
  const code = { style: 'code', size: 8.5, colour: dusk, align: 'right' } as const;
  canvas.text(at.code, middle + 1.05, row.player.bagCode, code);
  sheet.y += row.height;
  canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, hairline);
}

/** Totals by size, a line for each garment in each colour: what must lie in the carton when it is closed. */
function drawTotals(sheet: Sheet, pieces: readonly Piece[]): void {
  if (pieces.length === 0) return;
  const { type } = sheet.canvas;
  sheet.makeRoom(26);
  sheet.y += 7;
  sheet.canvas.text(sheet.left, sheet.y + 2, 'In the carton, by size', { style: 'strong', size: 11 });
  sheet.y += 5;
  sheet.canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, rule);
  const nameWidth = 46;
  const from = sheet.left + nameWidth + 4;
  const to = sheet.right - 16;
  for (const { style, colours } of pullGarments(pieces)) {
    for (const { colour, sizes, total } of colours) {
      const name = fitBlock(type, 'strong', style, {
        size: 9,
        smallest: 7.5,
        width: nameWidth,
        mostLines: 1,
      });
      const kit = fitBlock(type, 'text', colour, { size: 8, smallest: 7, width: nameWidth, mostLines: 1 });
      const cells = sizes.map((size) => {
        const text = size.code === '' ? noSize : size.code;
        const labelSize = fitSize(type, 'text', text, 8.5, 40);
        const width = measureText(type, 'text', text, labelSize);
        const count = measureText(type, 'figure', String(size.count), 13);
        return { text, labelSize, count: size.count, width: width + count + 7, labelWidth: width };
      });
      const lines = flow(cells, to - from);
      const height = Math.max(blockHeight(name) + blockHeight(kit) + 2.4, lines.length * 6.4 + 1.6);
      sheet.makeRoom(height);
      const { canvas, y } = sheet;
      const textTop = y + (height - blockHeight(name) - blockHeight(kit)) / 2;
      canvas.block(sheet.left, textTop, name);
      canvas.block(sheet.left, textTop + blockHeight(name), kit, { colour: dusk });
      lines.forEach((line, lineAt) => {
        const base = y + height / 2 + 1.7 + (lineAt - (lines.length - 1) / 2) * 6.4;
        let x = from;
        for (const cell of line) {
          const colour = cell.text === noSize ? care : dusk;
          canvas.text(x, base, cell.text, { style: 'text', size: cell.labelSize, colour });
          canvas.text(x + cell.labelWidth + 1.4, base, String(cell.count), { style: 'figure', size: 13 });
          x += cell.width;
        }
      });
      canvas.text(sheet.right, y + height / 2 + 1.9, String(total), {
        style: 'figure',
        size: 15,
        align: 'right',
      });
      sheet.y += height;
      canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, hairline);
    }
  }
  const base = sheet.y + 6;
  sheet.canvas.text(sheet.left, base, countOf(pieces.length, 'piece'), { style: 'strong', size: 9 });
  sheet.y += 8;
}

/** Who packed and who checked, for a pen. */
function drawSignature(sheet: Sheet): void {
  sheet.makeRoom(20);
  const { canvas } = sheet;
  sheet.y += 6;
  canvas.line(sheet.left, sheet.y, sheet.right, sheet.y, seam);
  const base = sheet.y + 11;
  const labels = ['Packed by', 'Checked by', 'Date'];
  const cell = sheet.width / labels.length;
  labels.forEach((label, at) => {
    const x = sheet.left + at * cell;
    const width = canvas.text(x, base, label, { style: 'text', size: 8.5, colour: dusk });
    canvas.line(x + width + 2, base + 0.5, x + cell - 4, base + 0.5, tickBox);
  });
  sheet.y = base + 3;
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

function chunk<T>(items: readonly T[], size: number): T[][] {
  return Array.from({ length: Math.ceil(items.length / size) }, (_, at) =>
    items.slice(at * size, at * size + size),
  );
}

/** Puts cells side by side and starts a new line when the next would go past `width` mm. */
function flow<T extends { width: number }>(cells: readonly T[], width: number): T[][] {
  const lines: T[][] = [];
  let used = 0;
  for (const cell of cells) {
    const line = lines.at(-1);
    if (line && used + cell.width <= width) {
      line.push(cell);
      used += cell.width;
    } else {
      lines.push([cell]);
      used = cell.width;
    }
  }
  return lines;
}
