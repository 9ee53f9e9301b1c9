import { decodeEntities, readAttribute } from './read-xml';

/** A cell that needs more than its stored value: its place (from 0) and what the file says of it. */
export type OddCell = {
  row: number;
  column: number;
  kind: 'formula without result' | 'error' | 'padded';
  text: string;
};

/** What a sheet's XML holds, found without building it: rows and cells with content, and cells that need a closer look. */
export type SheetScan =
  | { ok: true; filledRows: number; lastRow: number; columns: number; formulas: number; odd: OddCell[] }
  | { ok: false };

/** The largest sheet there is. Source: ECMA-376 Part 1, 18.3.1.4 and 18.3.1.73, as spreadsheets keep them. */
const mostRows = 1_048_576;
const mostColumns = 16_384;

const tags = /<(?:[^\s<>/:!?]+:)?(row|c)(?=[\s/>])([^>]*)>/g;
const closing = /<\/(?:[^\s<>/:]+:)?c\s*>/g;
const formula = /<(?:[^\s<>/:]+:)?f(?:\s[^>]*)?(?:\/>|>([^<]*)<\/)/;
const value = /<(?:[^\s<>/:]+:)?v(?:\s[^>]*)?>([^<]*)<\//;

function readPlace(reference: string): { row: number; column: number } | null {
  const match = /^([A-Z]{1,3})([0-9]{1,7})$/.exec(reference);
  if (!match) return null;
  let column = 0;
  for (const letter of match[1] ?? '') column = column * 26 + letter.charCodeAt(0) - 64;
  const row = Number(match[2]);
  return row < 1 || row > mostRows || column > mostColumns ? null : { row: row - 1, column: column - 1 };
}

/**
 * Looks through a sheet's XML for how much there is and for cells a plain reading would lose: formulas whose result
 * was not stored, errors, and numbers shown with leading zeros (`padding` gives the number of digits by style). Not ok
 * when a row or cell doesn't say where it stands, or stands outside any sheet; a reader would trip over it.
 */
export function scanSheet(xml: string, padding: ReadonlyMap<number, number>): SheetScan {
  if (xml.includes('<!DOCTYPE') || xml.includes('<!ENTITY')) return { ok: false };
  const filled = new Set<number>();
  const scan = { filledRows: 0, lastRow: 0, columns: 0, formulas: 0, odd: [] as OddCell[] };
  tags.lastIndex = 0;
  for (let tag = tags.exec(xml); tag !== null; tag = tags.exec(xml)) {
    const [, name, attributes = ''] = tag;
    if (name === 'row') {
      const row = readAttribute(attributes, 'r');
      if (row === undefined || (row !== null && !(/^[0-9]{1,7}$/.test(row) && Number(row) <= mostRows))) {
        return { ok: false };
      }
      continue;
    }
    const place = readPlace(readAttribute(attributes, 'r') ?? '');
    if (place === null) return { ok: false };
    if (attributes.endsWith('/')) continue;
    closing.lastIndex = tags.lastIndex;
    const end = closing.exec(xml);
    if (end === null) return { ok: false };
    const body = xml.slice(tags.lastIndex, end.index);
    tags.lastIndex = closing.lastIndex;
    if (!/[^\s]/.test(body)) continue;
    filled.add(place.row);
    scan.lastRow = Math.max(scan.lastRow, place.row + 1);
    scan.columns = Math.max(scan.columns, place.column + 1);
    const type = readAttribute(attributes, 't') ?? 'n';
    const stored = value.exec(body)?.[1];
    const worked = formula.exec(body);
    if (worked) scan.formulas += 1;
    if (worked && (stored === undefined || (stored === '' && type !== 'str'))) {
      const text = `=${decodeEntities(worked[1] ?? '')}`;
      scan.odd.push({ ...place, kind: 'formula without result', text });
    } else if (type === 'e')
      scan.odd.push({ ...place, kind: 'error', text: decodeEntities(stored ?? '#N/A') });
    else if (type === 'n' && padding.size > 0) {
      const digits = padding.get(Number(readAttribute(attributes, 's') ?? -1));
      if (digits !== undefined && stored !== undefined && /^[0-9]+$/.test(stored)) {
        scan.odd.push({ ...place, kind: 'padded', text: stored.padStart(digits, '0') });
      }
    }
  }
  scan.filledRows = filled.size;
  return { ok: true, ...scan };
}
