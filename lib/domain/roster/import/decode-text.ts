import { refuseSize } from './limits';
import { refuse, type Refusal } from './refusal';

/** Encodings recognised without being told. */
type TextEncoding = 'UTF-8' | 'UTF-8 with BOM' | 'UTF-16 LE' | 'UTF-16 BE' | 'Windows-1252';

/** Encodings a person may choose when the guess shows wrong letters: our name, and the label of the Encoding Standard. */
export const encodingChoices = [
  { label: 'utf-8', name: 'UTF-8' },
  { label: 'utf-16le', name: 'UTF-16 LE' },
  { label: 'utf-16be', name: 'UTF-16 BE' },
  { label: 'windows-1252', name: 'Windows-1252, Western Europe' },
  { label: 'windows-1250', name: 'Windows-1250, Central Europe' },
  { label: 'windows-1254', name: 'Windows-1254, Turkish' },
  { label: 'iso-8859-2', name: 'ISO 8859-2, Central Europe' },
  { label: 'macintosh', name: 'Mac Roman, older Mac files' },
] as const;
export type EncodingLabel = (typeof encodingChoices)[number]['label'];

/**
 * Text read from bytes. `sure` is false when the bytes would be just as valid in another encoding: then `sample` holds
 * up to five pieces of text with letters outside ASCII, for a person to look at, and `note` says so.
 */
type DecodedText = {
  ok: true;
  text: string;
  encoding: string;
  sure: boolean;
  sample: string[];
  note?: string;
};
export type DecodeResult = DecodedText | Refusal;

const notText = refuse(
  'not-text',
  'This file is not a list that can be read: it holds bytes that are not text. Save the list as CSV or as an Excel workbook (.xlsx) and bring that in.',
);

const decode = (bytes: Uint8Array, label: string): string | null => {
  try {
    return mendWindows1252(new TextDecoder(label, { fatal: true, ignoreBOM: true }).decode(bytes), label);
  } catch {
    return null;
  }
};

/** Decodes with every unreadable sequence shown as U+FFFD, and says how many there were. */
function decodeLoosely(bytes: Uint8Array, label: string): { text: string; note?: string } {
  const whole = decode(bytes, label);
  if (whole !== null) return { text: whole };
  const text = mendWindows1252(new TextDecoder(label, { ignoreBOM: true }).decode(bytes), label);
  const broken = text.split('\uFFFD').length - 1;
  const places = broken === 1 ? '1 place' : `${broken} places`;
  return {
    text,
    note: `${places} could not be read as text and shows as \uFFFD. Look for it and type it again.`,
  };
}

/** What the bytes 80 to 9F mean in Windows-1252, in order; five of them mean nothing. WHATWG Encoding Standard, index. */
const highPunctuation = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008DŽ\u008F\u0090‘’“”•–—˜™š›œ\u009DžŸ';

/**
 * Some versions of Node.js read Windows-1252 as ISO 8859-1, so that an apostrophe (byte 92) comes out as an invisible
 * control character; a right reading is left as it is.
 */
const mendWindows1252 = (text: string, label: string): string =>
  label === 'windows-1252'
    ? text.replace(/[\u0080-\u009F]/g, (control) => highPunctuation[control.charCodeAt(0) - 0x80] ?? control)
    : text;

/** Control characters that no list holds: C0 apart from tab, line ends, page and vertical feed, and end-of-file 1A. */
const controls = /[\u0000-\u0008\u000E-\u0019\u001B-\u001F]/g;
const withoutBom = (text: string): string => (text.startsWith('\uFEFF') ? text.slice(1) : text);
const looksBinary = (text: string): boolean => {
  if (text.includes('\u0000')) return true;
  const count = text.match(controls)?.length ?? 0;
  return count > 2 && count > text.length / 200;
};

/** Signatures of common kinds of file that are not text. "from memory" */
const magics: readonly (readonly number[])[] = [
  [0x25, 0x50, 0x44, 0x46, 0x2d], // PDF
  [0x50, 0x4b, 0x03, 0x04], // ZIP and everything built on it
  [0x50, 0x4b, 0x05, 0x06], // an empty ZIP
  [0xd0, 0xcf, 0x11, 0xe0], // compound file: old or encrypted office documents
  [0x89, 0x50, 0x4e, 0x47], // PNG
  [0xff, 0xd8, 0xff], // JPEG
  [0x47, 0x49, 0x46, 0x38], // GIF
  [0x1f, 0x8b], // gzip
];

/** Which byte of each pair is zero in UTF-16 text without a mark: the high byte of every comma, digit and line end. */
function guessUtf16(bytes: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  if (bytes.length < 4 || bytes.length % 2 !== 0) return null;
  let even = 0;
  let odd = 0;
  for (let index = 0; index < bytes.length; index += 2) {
    if (bytes[index] === 0) even += 1;
    if (bytes[index + 1] === 0) odd += 1;
  }
  const label = odd > 0 && even === 0 ? 'utf-16le' : even > 0 && odd === 0 ? 'utf-16be' : null;
  if (label === null) return null;
  const text = decode(bytes, label);
  // Letters only: unassigned and private characters are what two unrelated bytes look like when read as one.
  return text !== null && !looksBinary(text) && !/[\p{Cn}\p{Co}]/u.test(text) ? label : null;
}

const separators = /[\r\n\t,;|"]/;

/** Up to five pieces of the text, each within one cell, that hold letters outside ASCII. */
function sampleLetters(text: string): string[] {
  const pieces = new Set<string>();
  const foreign = /[^\u0000-\u007F]/g;
  while (pieces.size < 5) {
    const at = foreign.exec(text)?.index;
    if (at === undefined) break;
    const before =
      text
        .slice(Math.max(0, at - 40), at)
        .split(separators)
        .at(-1) ?? '';
    const after = text.slice(at, at + 40).split(separators)[0] ?? '';
    pieces.add((before + after).trim());
    foreign.lastIndex = at + Math.max(1, after.length);
  }
  return [...pieces];
}

const read = (text: string, encoding: string, sure: boolean, note?: string): DecodeResult => {
  if (looksBinary(text)) return notText;
  const plain = withoutBom(text);
  if (plain.trim() === '') return refuse('empty', 'This file is empty. Choose the file that holds the list.');
  const result: DecodedText = {
    ok: true,
    text: plain,
    encoding,
    sure,
    sample: sure ? [] : sampleLetters(plain),
  };
  return note === undefined ? result : { ...result, note };
};

/**
 * Reads bytes of a text file of at most 5 MB: a byte-order mark decides; else UTF-8 when every byte fits it; else UTF-16
 * when its zero bytes say so; else Windows-1252, which fits anything, so `sure` is false and the screen should show the
 * sample and offer `encodingChoices`. Refuses PDF, ZIP, pictures and anything else that is not text; never throws.
 */
export function decodeText(bytes: Uint8Array): DecodeResult {
  const tooLarge = refuseSize(bytes.length);
  if (tooLarge) return tooLarge;
  if (bytes.length === 0) return refuse('empty', 'This file is empty. Choose the file that holds the list.');
  if (magics.some((magic) => magic.every((byte, index) => bytes[index] === byte))) return notText;
  const [first, second, third] = bytes;
  if (first === 0xff && second === 0xfe) return readMarked(bytes.subarray(2), 'utf-16le', 'UTF-16 LE');
  if (first === 0xfe && second === 0xff) return readMarked(bytes.subarray(2), 'utf-16be', 'UTF-16 BE');
  if (first === 0xef && second === 0xbb && third === 0xbf) {
    return readMarked(bytes.subarray(3), 'utf-8', 'UTF-8 with BOM');
  }
  const utf16 = guessUtf16(bytes);
  if (utf16 !== null) {
    return read(decode(bytes, utf16) ?? '', utf16 === 'utf-16le' ? 'UTF-16 LE' : 'UTF-16 BE', true);
  }
  const utf8 = decode(bytes, 'utf-8');
  if (utf8 !== null) return read(utf8, 'UTF-8', true);
  return read(
    mendWindows1252(new TextDecoder('windows-1252').decode(bytes), 'windows-1252'),
    'Windows-1252',
    false,
    'The file does not say how its letters are stored, so they were read as Windows-1252. If names look wrong, choose another encoding.',
  );
}

/** Reads what stands behind a byte-order mark; broken sequences are shown and counted, not dropped. */
function readMarked(bytes: Uint8Array, label: EncodingLabel, encoding: TextEncoding): DecodeResult {
  const { text, note } = decodeLoosely(bytes, label);
  return read(text, encoding, true, note);
}

/**
 * Reads bytes in the encoding a person chose. Sequences that do not exist in it show as U+FFFD and are counted in
 * `note`; the same refusals as `decodeText`.
 */
export function decodeTextAs(bytes: Uint8Array, label: EncodingLabel): DecodeResult {
  const tooLarge = refuseSize(bytes.length);
  if (tooLarge) return tooLarge;
  const { text, note } = decodeLoosely(bytes, label);
  const name = encodingChoices.find((choice) => choice.label === label)?.name ?? label;
  return read(text, name, true, note);
}
