import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { tabulateDigits, tabulateGarments, tabulatePackingList, tabulatePieces } from './tables';

const packingColumns = tabulatePackingList({
  id: '',
  name: '',
  slug: '',
  division: '',
  kits: { home: { name: '', body: '', sleeves: '', number: '', outline: null }, away: null },
  garments: [],
  players: [],
}).columns;

/** A plain text that says what each file of the bundle is and what the columns of the data files mean. */
export function writeReadMe(
  snapshot: BatchSnapshot,
  files: readonly { path: string; label: string }[],
): Uint8Array {
  const { code, league, season } = snapshot.batch;
  const tables = [
    ['data/pieces', tabulatePieces(snapshot).columns],
    ['data/garments', tabulateGarments(snapshot).columns],
    ['data/digits', tabulateDigits(snapshot).columns],
    ['packing-lists', [...packingColumns, { name: 'and one a piece', meaning: 'size; empty for none' }]],
  ] as const;
  const width = Math.max(...files.map((file) => file.path.length), 0) + 2;
  const lines = [
    `Batch ${code}, ${league}, ${season}`,
    '',
    'These files hold children’s names. Give them only to those who press, pack and hand out this kit, and delete',
    'them when that is done.',
    '',
    'Files',
    ...files.map((file) => `  ${file.path.padEnd(width)}${file.label}`),
    `  ${'manifest.json'.padEnd(width)}Size and SHA-256 of every file, and notes on what is missing`,
    '',
    'CSV files are UTF-8 with a byte order mark, commas and one heading row. A text that a spreadsheet would run as a',
    'formula starts with an apostrophe there; the JSON files hold it as it was entered. Numbers are text: 07 is not 7.',
    ...tables.flatMap(([name, columns]) => [
      '',
      `Columns of ${name}`,
      ...columns.map((entry) => `  ${entry.name.padEnd(18)}${entry.meaning}`),
    ]),
  ];
  return new TextEncoder().encode(`${lines.join('\r\n')}\r\n`);
}
