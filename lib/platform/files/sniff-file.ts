import { refuse, type Refusal } from '@/lib/domain/roster/import/refusal';
import { listZip, type ZipFault } from './read-zip';

/** What an uploaded file turned out to be, from its first bytes; its name only helps to say what it is called. */
export type SniffedFile = { ok: true; kind: 'workbook' | 'text' } | Refusal;

const saveAsWorkbook = 'Open it, choose Save as, take Excel workbook (.xlsx) or CSV, and bring that file in.';

const startsWith = (bytes: Uint8Array, ...signature: number[]): boolean =>
  signature.every((byte, index) => bytes[index] === byte);

/** Signatures of kinds of file people pick by mistake, and what to call them. From memory. */
const mistaken: readonly { signature: readonly number[]; what: string }[] = [
  { signature: [0x25, 0x50, 0x44, 0x46, 0x2d], what: 'a PDF document' },
  { signature: [0x89, 0x50, 0x4e, 0x47], what: 'a picture (PNG)' },
  { signature: [0xff, 0xd8, 0xff], what: 'a picture (JPEG)' },
  { signature: [0x47, 0x49, 0x46, 0x38], what: 'a picture (GIF)' },
  { signature: [0x42, 0x4d], what: 'a picture (BMP)' },
  { signature: [0x49, 0x49, 0x2a, 0x00], what: 'a picture (TIFF)' },
  { signature: [0x7b, 0x5c, 0x72, 0x74, 0x66], what: 'a text document (RTF)' },
  { signature: [0x1f, 0x8b], what: 'a packed file (gzip)' },
  { signature: [0x37, 0x7a, 0xbc, 0xaf], what: 'a packed folder (7z)' },
  { signature: [0x52, 0x61, 0x72, 0x21], what: 'a packed folder (RAR)' },
];

/** The refusal of a file that is something else altogether. */
const refuseKind = (
  what: string,
  advice = 'Bring the list in as an Excel workbook (.xlsx) or as CSV.',
): Refusal => refuse('wrong-type', `This file is ${what}, not a list. ${advice}`);

/** The sentence for an archive that can't or won't be unpacked. */
export function refuseZip(fault: ZipFault): Refusal {
  switch (fault) {
    case 'encrypted':
      return refuse(
        'password-protected',
        `This file is protected by a password. Save it without one. ${saveAsWorkbook}`,
      );
    case 'too large':
      return refuse(
        'unpacks-too-large',
        'This workbook unpacks to far more than a list needs. Copy the rows of the list into a new workbook and bring that in.',
      );
    case 'too many entries':
      return refuse(
        'unpacks-too-large',
        'This workbook has too many parts. Copy the rows of the list into a new workbook and bring that in.',
      );
    case 'damaged':
      return refuse('damaged', `This file is damaged or was not sent whole. ${saveAsWorkbook}`);
  }
}

/** An office compound file: encrypted, old, or neither, told by the names of its streams. Source: [MS-OFFCRYPTO] 2.3.4, [MS-XLS] 2.1.2. */
function sniffCompound(bytes: Uint8Array): Refusal {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const holds = (stream: string): boolean => buffer.includes(Buffer.from(stream, 'utf16le'));
  if (holds('EncryptedPackage')) {
    return refuse(
      'password-protected',
      `This workbook is protected by a password, so it can't be read. Save a copy without the password and bring that in.`,
    );
  }
  if (holds('WordDocument')) return refuseKind('a text document (.doc)', saveAsWorkbook);
  if (holds('Workbook') || holds('Book')) {
    return refuse('old-workbook', `This workbook is in the old .xls format. ${saveAsWorkbook}`);
  }
  return refuse(
    'old-workbook',
    `This file is an old office document or one protected by a password. Take the password off if there is one. ${saveAsWorkbook}`,
  );
}

function sniffArchive(bytes: Uint8Array): SniffedFile {
  const listing = listZip(bytes);
  const names = listing.ok ? listing.names : [];
  const has = (test: (name: string) => boolean): boolean => names.some(test);
  if (!listing.ok) return refuseZip(listing.fault);
  if (has((name) => /(?:^|\/)vbaProject\.bin$/i.test(name))) {
    return refuse(
      'macro-workbook',
      'This workbook holds macros, which are not taken in. Choose Save as, take Excel workbook (.xlsx) without macros, and bring that file in.',
    );
  }
  if (has((name) => name === 'xl/workbook.xml')) return { ok: true, kind: 'workbook' };
  if (has((name) => name === 'xl/workbook.bin')) {
    return refuse('old-workbook', `This is a binary workbook (.xlsb). ${saveAsWorkbook}`);
  }
  if (has((name) => name.startsWith('word/'))) return refuseKind('a text document (.docx)', saveAsWorkbook);
  if (has((name) => name.startsWith('ppt/'))) return refuseKind('a presentation (.pptx)');
  if (has((name) => name === 'Index/Document.iwa' || name.startsWith('Index/') || name === 'Index.zip')) {
    return refuseKind(
      'a Numbers or Pages document',
      'Choose Export to, take Excel or CSV, and bring that file in.',
    );
  }
  if (has((name) => name === 'content.xml')) {
    return refuseKind('an OpenDocument file (.ods or .odt)', saveAsWorkbook);
  }
  return refuseKind('a packed folder (ZIP)', 'Unpack it and bring in the list itself, as .xlsx or CSV.');
}

/**
 * Tells what a file is from its bytes, whatever its name says: a workbook in the .xlsx format, text, or something
 * that can't be taken in, with the sentence that names it and says what to do. Unpacks nothing. Never throws.
 */
export function sniffFile(bytes: Uint8Array, name: string): SniffedFile {
  if (bytes.length === 0) {
    return refuse(
      'empty',
      `${name === '' ? 'This file' : name} is empty. Choose the file that holds the list.`,
    );
  }
  if (startsWith(bytes, 0xd0, 0xcf, 0x11, 0xe0)) return sniffCompound(bytes);
  if (startsWith(bytes, 0x50, 0x4b)) return sniffArchive(bytes);
  const kind = mistaken.find(({ signature }) => startsWith(bytes, ...signature));
  if (kind) return refuseKind(kind.what);
  const start = new TextDecoder('utf-8').decode(bytes.subarray(0, 1024)).trimStart().toLowerCase();
  if (/^(?:<!doctype html|<html|<table|<head|<body)/.test(start))
    return refuseKind('a web page (HTML)', saveAsWorkbook);
  if (start.startsWith('<?xml')) return refuseKind('an XML file', saveAsWorkbook);
  return { ok: true, kind: 'text' };
}
