import { mmPerPoint, type TextBlock } from '../text/fit-text';
import type { FaceName, TypeStyle } from '../text/font-faces';
import { boxAdvance, type PlacedGlyph, type ShapedText, type TypeCase } from '../text/type-case';

/** A colour as six hexadecimal digits with a leading #. */
export type Hex = string;

/** A path in mm: move, line, curve (two control points), close. */
export type PathStep =
  ['M' | 'L', number, number] | ['C', number, number, number, number, number, number] | ['Z'];

export type Stroke = { colour: Hex; width: number; dash?: readonly [number, number] | undefined };
export type TextPaint = {
  style: TypeStyle;
  size: number;
  colour?: Hex;
  align?: 'left' | 'right' | 'centre';
  /** Drawn round the letters, half of its width outside them; in mm. */
  outline?: { colour: Hex; width: number } | undefined;
};

/** Rounded to a thousandth of a point: finer than any press, and the same text on every machine. */
const write = (value: number): string => String(Math.round(value * 1000) / 1000 || 0);
const points = (mm: number): number => mm / mmPerPoint;

const writeColour = (hex: Hex): string =>
  [1, 3, 5].map((at) => write(parseInt(hex.slice(at, at + 2), 16) / 255)).join(' ');

/**
 * A page to draw on. Lengths are mm from the top left corner, sizes of type points, line widths mm. It writes PDF
 * operators (ISO 32000-1, annex A) and keeps which glyphs it used; it reads no clock and no locale.
 */
export class Canvas {
  readonly width: number;
  readonly height: number;
  readonly used = new Map<FaceName, Map<number, PlacedGlyph>>();
  /** Letters on this page that no font could draw, in the order in which they came. */
  readonly missing: string[] = [];
  private readonly operators: string[] = [];

  constructor(
    readonly type: TypeCase,
    size: { width: number; height: number },
  ) {
    this.width = size.width;
    this.height = size.height;
  }

  /** The content stream of the page. */
  content(): string {
    return this.operators.join('\n');
  }

  private at(x: number, y: number): string {
    return `${write(points(x))} ${write(points(this.height - y))}`;
  }

  line(x1: number, y1: number, x2: number, y2: number, stroke: Stroke): void {
    this.path(
      [
        ['M', x1, y1],
        ['L', x2, y2],
      ],
      { stroke },
    );
  }

  rect(x: number, y: number, width: number, height: number, paint: { fill?: Hex; stroke?: Stroke }): void {
    this.path(
      [['M', x, y], ['L', x + width, y], ['L', x + width, y + height], ['L', x, y + height], ['Z']],
      paint,
    );
  }

  /** A rectangle with rounded corners of `radius` mm. */
  card(
    x: number,
    y: number,
    width: number,
    height: number,
    radius: number,
    paint: { fill?: Hex; stroke?: Stroke },
  ): void {
    const [r, b] = [x + width, y + height];
    const k = radius * 0.4477; // what is left of the radius beside the control point of a quarter circle
    this.path(
      [
        ['M', x + radius, y],
        ['L', r - radius, y],
        ['C', r - k, y, r, y + k, r, y + radius],
        ['L', r, b - radius],
        ['C', r, b - k, r - k, b, r - radius, b],
        ['L', x + radius, b],
        ['C', x + k, b, x, b - k, x, b - radius],
        ['L', x, y + radius],
        ['C', x, y + k, x + k, y, x + radius, y],
        ['Z'],
      ],
      paint,
    );
  }

  path(steps: readonly PathStep[], paint: { fill?: Hex; stroke?: Stroke }): void {
    const { fill, stroke } = paint;
    const set = [
      ...(fill ? [`${writeColour(fill)} rg`] : []),
      ...(stroke ? [`${writeColour(stroke.colour)} RG ${write(points(stroke.width))} w 1 j`] : []),
      ...(stroke?.dash ? [`[${stroke.dash.map((part) => write(points(part))).join(' ')}] 0 d`] : []),
    ];
    const drawn = steps.map((step) => this.writeStep(step));
    const end = fill && stroke ? 'B' : fill ? 'f' : 'S';
    this.operators.push(['q', ...set, ...drawn, end, 'Q'].join(' '));
  }

  private writeStep(step: PathStep): string {
    switch (step[0]) {
      case 'M':
        return `${this.at(step[1], step[2])} m`;
      case 'L':
        return `${this.at(step[1], step[2])} l`;
      case 'C':
        return `${this.at(step[1], step[2])} ${this.at(step[3], step[4])} ${this.at(step[5], step[6])} c`;
      case 'Z':
        return 'h';
    }
  }

  /** Many rectangles of one colour in one go, each as x, y, width, height: for the modules of a code. */
  modules(rects: readonly (readonly [number, number, number, number])[], fill: Hex): void {
    const drawn = rects.map(
      ([x, y, w, h]) => `${this.at(x, y + h)} ${write(points(w))} ${write(points(h))} re`,
    );
    this.operators.push(['q', `${writeColour(fill)} rg`, ...drawn, 'f', 'Q'].join(' '));
  }

  /** Draws a text with its baseline at `y`; `x` is its left end, right end or middle. Answers its width in mm. */
  text(x: number, y: number, text: string, paint: TextPaint): number {
    return this.shaped(x, y, this.type.shape(paint.style, text), paint);
  }

  /** Draws the lines of a block, the first with its top at `y`. Answers the height in mm. */
  block(x: number, y: number, block: TextBlock, paint: Omit<TextPaint, 'style' | 'size'> = {}): number {
    // Four fifths of a line lie above the baseline, room for capitals with marks (judged by eye).
    block.lines.forEach((line, at) => {
      this.shaped(x, y + block.leading * (at + 0.8), line, {
        ...paint,
        style: block.style,
        size: block.size,
      });
    });
    return block.lines.length * block.leading;
  }

  shaped(x: number, y: number, line: ShapedText, paint: TextPaint): number {
    const em = paint.size * mmPerPoint;
    const width = line.width * em;
    const start = x - (paint.align === 'right' ? width : paint.align === 'centre' ? width / 2 : 0);
    const colour = paint.colour ?? '#1d1a16';
    this.missing.push(...line.missing);
    if (paint.outline) this.glyphs(line, start, y, paint.size, paint.outline.colour, paint.outline.width);
    this.glyphs(line, start, y, paint.size, colour);
    for (const glyph of line.glyphs) {
      if (glyph.face === null) this.missingBox(start + glyph.x * em, y, em, colour);
    }
    return width;
  }

  /** A box with a cross stands for a letter that cannot be drawn: plainly wrong rather than silently absent. */
  private missingBox(x: number, y: number, em: number, colour: Hex): void {
    const [left, top, width, height] = [x + 0.06 * em, y - 0.7 * em, (boxAdvance - 0.12) * em, 0.7 * em];
    const stroke = { colour, width: 0.05 * em };
    this.rect(left, top, width, height, { stroke });
    this.line(left, top, left + width, top + height, stroke);
    this.line(left + width, top, left, top + height, stroke);
  }

  private glyphs(line: ShapedText, x: number, y: number, size: number, colour: Hex, outline?: number): void {
    const em = size * mmPerPoint;
    const out = ['q', `${writeColour(colour)} ${outline === undefined ? 'rg' : 'RG'}`];
    if (outline !== undefined) out.push(`${write(points(outline))} w 1 j 1 Tr`);
    out.push('BT');
    for (const [face, glyphs] of listStretches(line.glyphs)) {
      const used = this.used.get(face) ?? new Map<number, PlacedGlyph>();
      this.used.set(face, used);
      out.push(`/${face} ${write(size)} Tf`);
      out.push(this.writeStretch(face, glyphs, x, y, em));
      for (const glyph of glyphs) used.set(glyph.id, used.get(glyph.id) ?? glyph);
    }
    out.push('ET', 'Q');
    this.operators.push(out.join(' '));
  }

  /** Glyphs of one face: kerning as adjustments between them, a place of its own for a glyph that is lifted. */
  private writeStretch(
    face: FaceName,
    glyphs: readonly PlacedGlyph[],
    x: number,
    y: number,
    em: number,
  ): string {
    const out: string[] = [];
    let lift = NaN;
    let pen = 0;
    for (const glyph of glyphs) {
      if (glyph.y !== lift) {
        if (out.length > 0) out.push('] TJ ');
        out.push(`1 0 0 1 ${this.at(x + glyph.x * em, y - glyph.y * em)} Tm [`);
        [lift, pen] = [glyph.y, glyph.x];
      }
      const back = Math.round((pen - glyph.x) * 100_000) / 100;
      if (back !== 0) out.push(write(back));
      out.push(`<${glyph.id.toString(16).padStart(4, '0')}>`);
      pen += this.nominalAdvance(face, glyph.id) - back / 1000;
    }
    return [...out, '] TJ'].join('');
  }

  /** How far a viewer moves after a glyph: its own width as the file states it, without kerning. */
  private nominalAdvance(face: FaceName, id: number): number {
    const font = this.type.faces.get(face)?.font;
    return font ? Math.round((font.getGlyph(id).advanceWidth * 1000) / font.unitsPerEm) / 1000 : 0;
  }
}

function listStretches(glyphs: readonly PlacedGlyph[]): [FaceName, PlacedGlyph[]][] {
  const stretches: [FaceName, PlacedGlyph[]][] = [];
  for (const glyph of glyphs) {
    const last = stretches.at(-1);
    if (glyph.face === null) continue;
    if (last && last[0] === glyph.face) last[1].push(glyph);
    else stretches.push([glyph.face, [glyph]]);
  }
  return stretches;
}
