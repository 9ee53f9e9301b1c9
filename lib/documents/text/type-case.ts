import { createHash } from 'node:crypto';
import fontkit, { type Font } from '@pdf-lib/fontkit';
import subsetFont from 'subset-font';
import { covers, openFace, styleFaces, typeStyles, type FaceName, type TypeStyle } from './font-faces';
import { splitRuns } from './split-runs';

/** A font cut down to the letters of one batch: the file to embed, and the same file opened for measuring. */
export type SubsetFace = { name: FaceName; file: Buffer; font: Font; tag: string };

/** A glyph in its place: `x`, `y` and `advance` in ems from the start of the line, `face` null for a box. */
export type PlacedGlyph = {
  face: FaceName | null;
  id: number;
  x: number;
  y: number;
  advance: number;
  /** The characters it stands for, empty for a part of a letter. */
  text: string;
};

/** A line of text as it will be drawn; `missing` are the letters that no font here can draw. */
export type ShapedText = { glyphs: PlacedGlyph[]; width: number; missing: string[] };

/** The type of one batch: every line is measured and drawn with the same glyphs, so what fits is what is printed. */
export type TypeCase = {
  faces: ReadonlyMap<FaceName, SubsetFace>;
  shape: (style: TypeStyle, text: string) => ShapedText;
};

/** The advance of the box that stands for a letter that cannot be drawn, in ems. */
export const boxAdvance = 0.64;

/** What the documents themselves say may use any of these; the batch's own texts come on top. */
const plainCharacters = Array.from({ length: 95 }, (_, i) => String.fromCharCode(32 + i)).join('');
const houseCharacters = `${plainCharacters}–—’“”·×…°é`;

const isJoiner = (code: number): boolean =>
  code === 0x200c || code === 0x200d || (code >= 0xfe00 && code <= 0xfe0f);

/**
 * Cuts each needed font down to the letters of these texts and opens the result. The same texts give the same bytes
 * whatever their order. Fonts for other scripts are read only when a text needs them.
 */
export async function makeTypeCase(texts: readonly string[]): Promise<TypeCase> {
  const needed = listNeededCharacters(texts);
  const faces = new Map<FaceName, SubsetFace>();
  for (const [name, characters] of [...needed].sort(([a], [b]) => (a < b ? -1 : 1))) {
    const face = openFace(name);
    if (face) faces.set(name, await cutFace(face, [...characters].sort().join('')));
  }
  const known = new Map<string, ShapedText>();
  return {
    faces,
    shape(style, text) {
      const key = `${style}/${text}`;
      const found = known.get(key);
      if (found) return found;
      const shaped = shapeText(faces, style, text);
      known.set(key, shaped);
      return shaped;
    },
  };
}

function listNeededCharacters(texts: readonly string[]): Map<FaceName, Set<string>> {
  const needed = new Map<FaceName, Set<string>>();
  const add = (face: FaceName, text: string) => {
    const characters = needed.get(face) ?? new Set();
    for (const character of text) characters.add(character);
    needed.set(face, characters);
  };
  const unique = [...new Set(texts)];
  // A line broken elsewhere may start with a mark that then goes to another face of the style.
  const alone = [...new Set(unique.join(''))].filter((character) => character > '~');
  for (const style of typeStyles) {
    const first = styleFaces[style][0];
    if (first) add(first, houseCharacters);
    for (const run of [...unique, ...alone].flatMap((text) => splitRuns(style, text))) {
      if (run.face !== null) add(run.face, run.text);
    }
  }
  // A comma or a figure that a document puts behind a name is drawn in the face of that name.
  for (const face of needed.keys()) {
    for (const character of houseCharacters) {
      if (!/\p{L}/u.test(character) && covers(face, character)) add(face, character);
    }
  }
  return needed;
}

async function cutFace(
  face: { name: FaceName; file: Buffer; features: readonly string[] | null },
  characters: string,
): Promise<SubsetFace> {
  const options = {
    targetFormat: 'truetype' as const,
    noHinting: true,
    ...(face.features && { keepFeatures: [...face.features] }),
  };
  const file = await subsetFont(face.file, characters, options);
  return { name: face.name, file, font: fontkit.create(file), tag: tagOf(file) };
}

/** The six capitals before the name of a font subset (ISO 32000-1, 9.6.4), from its bytes. */
const tagOf = (file: Uint8Array): string =>
  [...createHash('sha256').update(file).digest().subarray(0, 6)]
    .map((byte) => String.fromCharCode(65 + (byte % 26)))
    .join('');

function shapeText(faces: ReadonlyMap<FaceName, SubsetFace>, style: TypeStyle, text: string): ShapedText {
  const glyphs: PlacedGlyph[] = [];
  const missing: string[] = [];
  let x = 0;
  const addBox = (letter: string) => {
    missing.push(letter);
    glyphs.push({ face: null, id: 0, x, y: 0, advance: boxAdvance, text: letter });
    x += boxAdvance;
  };
  for (const run of splitRuns(style, text)) {
    const face = run.face === null ? undefined : faces.get(run.face);
    if (!face) {
      addBox(run.text);
      continue;
    }
    const em = face.font.unitsPerEm;
    const laid = layOut(face.font, run.text, run.rightToLeft);
    laid.glyphs.forEach((glyph, at) => {
      const position = laid.positions[at];
      const characters = String.fromCodePoint(...glyph.codePoints);
      if (glyph.id === 0) {
        if (!glyph.codePoints.every(isJoiner)) addBox(characters);
        return;
      }
      const advance = (position?.xAdvance ?? glyph.advanceWidth) / em;
      glyphs.push({
        face: face.name,
        id: glyph.id,
        x: x + (position?.xOffset ?? 0) / em,
        y: (position?.yOffset ?? 0) / em,
        advance,
        text: characters,
      });
      x += advance;
    });
  }
  return { glyphs, width: x, missing };
}

/** The shaper also takes script, language and direction, which its types leave out. */
type Layout = (
  text: string,
  features: string[],
  script: undefined,
  language: undefined,
  direction: 'ltr' | 'rtl',
) => ReturnType<Font['layout']>;

function layOut(font: Font, text: string, rightToLeft: boolean): ReturnType<Font['layout']> {
  const layout = font.layout.bind(font) as unknown as Layout;
  return layout(text, ['tnum'], undefined, undefined, rightToLeft ? 'rtl' : 'ltr');
}
