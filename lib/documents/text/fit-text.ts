import { listGraphemes } from '@/lib/domain/text/graphemes';
import { tidyText } from '@/lib/domain/text/normalise-text';
import type { TypeStyle } from './font-faces';
import type { ShapedText, TypeCase } from './type-case';

/** Millimetres in a point of 1/72 inch. */
export const mmPerPoint = 25.4 / 72;

/** Lines of text set in one size (points) with their distance from baseline to baseline (mm). */
export type TextBlock = { style: TypeStyle; size: number; leading: number; lines: ShapedText[] };

/** The width of a text in mm at a size in points: the sum of the advances with which it will be drawn. */
export const measureText = (type: TypeCase, style: TypeStyle, text: string, size: number): number =>
  type.shape(style, text).width * size * mmPerPoint;

/**
 * The largest size in points, at most `size`, at which a text is no wider than `width` mm on one line. There is no
 * smallest size: for text that may get long, wrap it with `fitBlock`.
 */
export function fitSize(type: TypeCase, style: TypeStyle, text: string, size: number, width: number): number {
  const natural = measureText(type, style, text, size);
  return natural <= width ? size : Math.floor(((size * width) / natural) * 100) / 100;
}

/**
 * Breaks a text into lines no wider than `width` mm: at spaces, else after a hyphen, else between letters when a single
 * word is too wide. Nothing is left out. An empty text gives no line.
 */
export function wrapText(
  type: TypeCase,
  style: TypeStyle,
  text: string,
  size: number,
  width: number,
): string[] {
  const fits = (line: string): boolean => measureText(type, style, line, size) <= width;
  const lines: string[] = [];
  let line = '';
  const push = (piece: string, gap: string): void => {
    const longer = line === '' ? piece : `${line}${gap}${piece}`;
    if (fits(longer)) {
      line = longer;
      return;
    }
    if (line !== '') lines.push(line);
    line = '';
    if (fits(piece)) {
      line = piece;
      return;
    }
    for (const letter of listGraphemes(piece)) {
      if (line !== '' && !fits(line + letter)) {
        lines.push(line);
        line = '';
      }
      line += letter;
    }
  };
  for (const word of tidyText(text).split(' ').filter(Boolean)) {
    word.split(/(?<=[-–])(?=.)/u).forEach((piece, at) => push(piece, at === 0 ? ' ' : ''));
  }
  if (line !== '') lines.push(line);
  return lines;
}

type BlockShape = {
  size: number;
  /** Points; below it more lines are taken instead. */
  smallest: number;
  width: number;
  mostLines: number;
  /** Baseline to baseline as a multiple of the size. */
  leading?: number;
};

/**
 * Sets a text in at most `mostLines` lines by making it smaller, down to `smallest` points; what still doesn't fit then
 * takes more lines, so that a text is never cut. The caller makes room by `blockHeight`.
 */
export function fitBlock(type: TypeCase, style: TypeStyle, text: string, shape: BlockShape): TextBlock {
  let size = shape.size;
  let lines = wrapText(type, style, text, size, shape.width);
  while (lines.length > shape.mostLines && size > shape.smallest) {
    size = Math.max(shape.smallest, size - 0.5);
    lines = wrapText(type, style, text, size, shape.width);
  }
  return {
    style,
    size,
    leading: size * (shape.leading ?? 1.2) * mmPerPoint,
    lines: lines.map((line) => type.shape(style, line)),
  };
}

/** Like `fitBlock` for a space of fixed height in mm: the size shrinks until every line fits, however small. */
export function fitBox(
  type: TypeCase,
  style: TypeStyle,
  text: string,
  shape: Omit<BlockShape, 'smallest'> & { height: number },
): TextBlock {
  let size = shape.size;
  for (;;) {
    const block = fitBlock(type, style, text, { ...shape, size, smallest: size });
    if ((block.lines.length <= shape.mostLines && blockHeight(block) <= shape.height) || size <= 2)
      return block;
    size = Math.max(2, size * 0.94);
  }
}

/** The height of a block in mm, from the top of its first line to the foot of its last; 0 without lines. */
export const blockHeight = (block: TextBlock): number => block.lines.length * block.leading;

/** The width in mm of the widest line of a block. */
export const blockWidth = (block: TextBlock): number =>
  Math.max(0, ...block.lines.map((line) => line.width)) * block.size * mmPerPoint;
