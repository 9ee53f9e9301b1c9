import bwipjs from 'bwip-js/node';
import { z } from 'zod';
import type { Canvas } from './canvas';
import { ink } from './house-style';

const symbolSchema = z.array(
  z.object({ pixs: z.array(z.number()), pixx: z.number().int(), pixy: z.number().int() }),
);

/** Modules of white on every side that a reader needs (source: ISO/IEC 18004, quiet zone of four modules). */
export const quietModules = 4;

/**
 * The rows of a QR symbol, true for a dark module, without the quiet zone. Error correction is fixed at level M (the
 * encoder would raise it when there is room, and the symbol would change with its version).
 */
function encodeQrCode(text: string): boolean[][] {
  const options = { bcid: 'qrcode', text, eclevel: 'M', fixedeclevel: true };
  const [symbol] = symbolSchema.parse(bwipjs.raw(options));
  if (!symbol) throw new Error('The encoder gave no symbol.');
  return Array.from({ length: symbol.pixy }, (_, y) =>
    Array.from({ length: symbol.pixx }, (_, x) => symbol.pixs[y * symbol.pixx + x] === 1),
  );
}

/** Draws a QR symbol as rectangles, `width` mm wide without its quiet zone, which the caller keeps white. */
export function drawQrCode(canvas: Canvas, at: { x: number; y: number; width: number }, text: string): void {
  const rows = encodeQrCode(text);
  const side = at.width / rows.length;
  canvas.modules(
    rows.flatMap((row, y) =>
      listDarkRuns(row).map(
        ([from, length]) => [at.x + from * side, at.y + y * side, length * side, side] as const,
      ),
    ),
    ink,
  );
}

/** Dark modules side by side as one rectangle each: fewer operators, and no hairline gaps between them. */
function listDarkRuns(row: readonly boolean[]): [from: number, length: number][] {
  const runs: [number, number][] = [];
  row.forEach((dark, x) => {
    const last = runs.at(-1);
    if (!dark) return;
    if (last && last[0] + last[1] === x) last[1] += 1;
    else runs.push([x, 1]);
  });
  return runs;
}
