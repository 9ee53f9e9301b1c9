import { readFileSync } from 'node:fs';
import path from 'node:path';
import fontkit, { type Font } from '@pdf-lib/fontkit';

/**
 * The styles of type in documents: `text` and `strong` for words, `figure` for numbers as worn and large figures,
 * `code` for codes and names as they will be printed.
 */
export const typeStyles = ['text', 'strong', 'figure', 'code'] as const;
export type TypeStyle = (typeof typeStyles)[number];

const shipped = 'lib/documents/fonts';
const optional = 'node_modules/@expo-google-fonts';

/**
 * The font files, TrueType only (woff2 cannot be embedded). Those under `shipped` lie in the project with their
 * licences, so that the same batch gives the same bytes whatever happens to a package; the two large ones for Han,
 * kana and Hangul are used where their packages are installed. `features` keeps a subset small: the OpenType features
 * that matter for Latin, or all of them where letters join.
 */
const faceFiles = {
  'archivo-400': { file: `${shipped}/Archivo_400Regular.ttf`, features: 'latin' },
  'archivo-600': { file: `${shipped}/Archivo_600SemiBold.ttf`, features: 'latin' },
  'saira-800': { file: `${shipped}/SairaExtraCondensed_800ExtraBold.ttf`, features: 'latin' },
  'spline-500': { file: `${shipped}/SplineSansMono_500Medium.ttf`, features: 'latin' },
  'noto-400': { file: `${shipped}/NotoSans_400Regular.ttf`, features: 'latin' },
  'noto-600': { file: `${shipped}/NotoSans_600SemiBold.ttf`, features: 'latin' },
  'hebrew-400': { file: `${shipped}/NotoSansHebrew_400Regular.ttf`, features: 'all' },
  'hebrew-600': { file: `${shipped}/NotoSansHebrew_600SemiBold.ttf`, features: 'all' },
  'arabic-400': { file: `${shipped}/NotoSansArabic_400Regular.ttf`, features: 'all' },
  'arabic-600': { file: `${shipped}/NotoSansArabic_600SemiBold.ttf`, features: 'all' },
  'han-400': { file: `${optional}/noto-sans-sc/400Regular/NotoSansSC_400Regular.ttf`, features: 'latin' },
  'hangul-400': { file: `${optional}/noto-sans-kr/400Regular/NotoSansKR_400Regular.ttf`, features: 'latin' },
} as const;
export type FaceName = keyof typeof faceFiles;

const others400 = ['noto-400', 'hebrew-400', 'arabic-400', 'han-400', 'hangul-400'] as const;
const others600 = ['noto-600', 'hebrew-600', 'arabic-600', 'han-400', 'hangul-400'] as const;

/** The faces of each style, tried in this order for every letter. */
export const styleFaces: Record<TypeStyle, readonly FaceName[]> = {
  text: ['archivo-400', ...others400],
  strong: ['archivo-600', ...others600],
  figure: ['saira-800', 'archivo-600', ...others600],
  code: ['spline-500', 'archivo-400', ...others400],
};

/** Scripts whose letters are re-ordered: the shaper in use stops at them, so they are drawn as boxes and reported. */
const beyondShaper = /\p{Script=Devanagari}/u;

/** A font file as it was read; `features` are the OpenType features to keep in a subset, null for all. */
export type Face = {
  name: FaceName;
  file: Buffer;
  font: Font;
  features: readonly string[] | null;
};

const latinFeatures = ['ccmp', 'locl', 'kern', 'mark', 'mkmk', 'tnum'];
const opened = new Map<FaceName, Face | null>();

/**
 * The full font of a face, read once; null for an optional face whose package is not installed. Throws when a shipped
 * file is missing, which happens only if the program was started outside its own folder.
 */
export function openFace(name: FaceName): Face | null {
  const known = opened.get(name);
  if (known !== undefined) return known;
  const { file: place, features } = faceFiles[name];
  const file = readFontFile(place);
  const face = file && {
    name,
    file,
    font: fontkit.create(file),
    features: features === 'latin' ? latinFeatures : null,
  };
  opened.set(name, face);
  return face;
}

function readFontFile(place: string): Buffer | null {
  try {
    return readFileSync(path.join(process.cwd(), place));
  } catch (cause) {
    if (place.startsWith(optional)) return null;
    throw new Error(`The font ${place} is missing. Start the program in its own folder.`, { cause });
  }
}

const joiners = /[\u200c\u200d\ufe00-\ufe0f]/g;

/** Whether a face draws every character of a letter with its marks; joiners and variation marks don't count. */
export function covers(name: FaceName, letter: string): boolean {
  if (beyondShaper.test(letter)) return false;
  const font = openFace(name)?.font;
  if (!font) return false;
  return [...letter.replace(joiners, '')].every((character) =>
    font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0),
  );
}
