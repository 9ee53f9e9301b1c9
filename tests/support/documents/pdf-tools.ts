import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { readPgm, type GrayImage } from './gray-image';

/** Runs a program of Debian's poppler-utils on a PDF in a folder of its own and answers what `read` makes of it. */
function withPdf<T>(pdf: Uint8Array, run: (folder: string, file: string) => T): T {
  const folder = mkdtempSync(path.join(tmpdir(), 'raglan-pdf-'));
  try {
    const file = path.join(folder, 'in.pdf');
    writeFileSync(file, pdf);
    return run(folder, file);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function poppler(program: string, args: string[]): string {
  try {
    return execFileSync(program, args, {
      encoding: 'utf8',
      maxBuffer: 1 << 26,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
  } catch (cause) {
    throw new Error(`${program} failed; it comes with the Debian package poppler-utils.`, { cause });
  }
}

/** Every page as a grey picture at `dpi` dots per inch. */
export function rasterise(
  pdf: Uint8Array,
  dpi: number,
  pages?: { first: number; last: number },
): GrayImage[] {
  return withPdf(pdf, (folder, file) => {
    const range = pages ? ['-f', String(pages.first), '-l', String(pages.last)] : [];
    poppler('pdftoppm', ['-gray', '-r', String(dpi), ...range, file, path.join(folder, 'page')]);
    return readdirSync(folder)
      .filter((name) => name.endsWith('.pgm'))
      .sort()
      .map((name) => readPgm(readFileSync(path.join(folder, name))));
  });
}

/** The text of each page in the order in which it was drawn. */
export const readPdfText = (pdf: Uint8Array): string[] =>
  withPdf(pdf, (_, file) =>
    poppler('pdftotext', ['-raw', '-enc', 'UTF-8', file, '-']).split('\f').slice(0, -1),
  );

/** A word on a page, its box in points from the top left corner. */
export type PdfWord = { text: string; left: number; top: number; right: number; bottom: number };

const wordLine = /<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">(.*?)<\/word>/g;

/** The words of each page with their boxes, and the size of the page in points. */
export function readPdfWords(pdf: Uint8Array): { width: number; height: number; words: PdfWord[] }[] {
  const html = withPdf(pdf, (_, file) => poppler('pdftotext', ['-bbox', '-enc', 'UTF-8', file, '-']));
  return html
    .split('<page ')
    .slice(1)
    .map((page) => {
      const size = /width="([\d.]+)" height="([\d.]+)"/.exec(page);
      return {
        width: Number(size?.[1]),
        height: Number(size?.[2]),
        words: [...page.matchAll(wordLine)].map(([, left, top, right, bottom, text]) => ({
          text: (text ?? '').replaceAll('&lt;', '<').replaceAll('&gt;', '>').replaceAll('&amp;', '&'),
          left: Number(left),
          top: Number(top),
          right: Number(right),
          bottom: Number(bottom),
        })),
      };
    });
}
