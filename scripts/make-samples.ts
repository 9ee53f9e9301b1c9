// Writes the sample files of public/samples anew: `npx tsx scripts/make-samples.ts`. All people and teams are invented.
import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import ExcelJS from 'exceljs';

const folder = path.join(import.meta.dirname, '..', 'public', 'samples');

type Row = readonly string[];
const headings = ['Name', 'Number', 'Role', 'Jersey size', 'Shorts size'];
const roster: readonly Row[] = [
  ['Vane, Tilly', '4', 'captain', 'YM', 'YM'],
  ['Quill, Ana', '7', '', 'YL', 'YM'],
  ['Tarn, Bo', '00', '', 'YM', 'YM'],
  ['Marl, Zoë', '10', '', 'YS', 'YS'],
  ['Ostrow, Bex', '11', '', 'YL', 'YL'],
  ['Fenwold, Ivo', '12', '', 'YM', 'YS'],
  ['Sorrelby, Mina', '13', '', 'YXL', 'YL'],
  ['Dunlark, Rafi', '20', '', 'YM', 'YM'],
  ['Hazelrigg-Moss, Juno', '21', '', 'YM', 'YL'],
  ['O’Carrow, Dilys', '23', '', 'YS', 'YS'],
  ['Penhallick, Noor', '3', '', 'YL', 'YL'],
  ['Wexcombe, Leif', '0', '', 'YM', 'YM'],
  ['Brindle, Seb', '07', '', 'YM', 'YM'],
];

const quote = (cell: string, separator: string): string =>
  cell.includes(separator) || /["\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
const write = (rows: readonly Row[], separator = ',', newline = '\r\n'): string =>
  rows.map((row) => row.map((cell) => quote(cell, separator)).join(separator) + newline).join('');

/** Windows-1252 for the letters used here: Latin-1, and the curly apostrophe. */
const windows1252 = (text: string): Uint8Array => Buffer.from(text.replaceAll('’', '\u0092'), 'latin1');
const utf16 = (text: string): Uint8Array => Buffer.from(`\uFEFF${text}`, 'utf16le');

async function writeWorkbook(): Promise<Uint8Array> {
  const workbook = new ExcelJS.Workbook();
  workbook.created = new Date(Date.UTC(2027, 0, 4));
  workbook.modified = workbook.created;
  const sheet = workbook.addWorksheet('Roster');
  sheet.addRow(headings);
  for (const [name, number, ...others] of roster) {
    const row = sheet.addRow([name, Number(number), ...others]);
    // As a spreadsheet keeps a label with a leading zero: a number, and a format that shows the zero.
    if (number?.startsWith('0') && number !== '0') row.getCell(2).numFmt = '00';
  }
  return new Uint8Array(await workbook.xlsx.writeBuffer());
}

const files: Record<string, string | Uint8Array> = {
  'clean-roster.csv': write([headings, ...roster]),
  'clean-roster.xlsx': await writeWorkbook(),
  'semicolon-windows-1252.csv': windows1252(
    write(
      [
        ['Vorname', 'Nachname', 'Rückennummer', 'Größe'],
        ['Zoë', 'Müllerstett', '10', 'YM'],
        ['Jörg', 'Großhain', '7', 'YL'],
        ['Siân', 'O’Carrow', '00', 'YS'],
        ['Renée', 'Peñablanca', '0', 'YM'],
        ['Åse', 'Brønnvik', '23', 'YL'],
      ],
      ';',
    ),
  ),
  'utf16-tabs.txt': utf16(
    write(
      [
        ['First name', 'Last name', 'No.', 'Size'],
        ['Łucja', 'Wójtarz', '4', 'YM'],
        ['İlknaz', 'Şahbey', '5', 'YS'],
        ['Đurđa', 'Ćilovac', '00', 'YL'],
        ['Ελπίδα', 'Θαλασσή', '0', 'YM'],
        ['Nguyệt', 'Đồi Xanh', '14', 'YM'],
      ],
      '\t',
    ),
  ),
  'two-headings-and-totals.csv': write([
    ['Tern Estuary spring order', '', '', ''],
    ['Otters, page 1', '', '', ''],
    ['', '', '', ''],
    ['Player', 'No.', 'Jersey size', 'Paid'],
    ['Vane, Tilly', '4', 'YM', 'yes'],
    ['Quill, Ana', '7', 'YL', 'yes'],
    ['Subtotal', '2', '', ''],
    ['', '', '', ''],
    ['Player', 'No.', 'Jersey size', 'Paid'],
    ['Tarn, Bo', '10', 'YM', 'no'],
    ['Marl, Zoë', '11', 'YS', 'yes'],
    ['Total players', '4', '', ''],
  ]),
  'numbers-as-people-type-them.csv': write([
    ['Name', 'Number', 'Size'],
    ['Vane, Tilly', '7.0', 'YM'],
    ['Quill, Ana', 'No. 8', 'Youth medium'],
    ['Tarn, Bo', '#07', 'ym'],
    ['Marl, Zoë', '٩', 'Y M'],
    ['Ostrow, Bex', '１２', 'YOUTH LARGE'],
    ['Fenwold, Ivo', '00', 'YS'],
    ['Sorrelby, Mina', '0', 'YS'],
    ['Dunlark, Rafi', '14 or 15', 'YM'],
    ['O’Carrow, Dilys', 'twenty', 'YL'],
    ['Penhallick, Noor', '', 'YL'],
    ['Wexcombe, Leif', '3.5', 'enormous'],
  ]),
  'duplicates-and-long-names.csv': write([
    ['Name', 'Name on back', 'Number', 'Size', 'Size'],
    ['Vane, Tilly', 'VANE', '7', 'YM', 'YM'],
    ['Vane, Tobin', 'VANE', '7', 'YL', 'YM'],
    ['Quill, Ana', 'QUILL', '8', 'YM', 'YM'],
    ['ANA QUILL', 'QUILL', '18', 'YM', 'YM'],
    ['Ö', 'Ö', '9', 'YS', 'YS'],
    [
      'Fortescue-Brackenbury-Wetherington-Hollowaysdale, Maximiliana Theodora Evangeline',
      'FORTESCUE-BRACKENBURY-WETHERINGTON',
      '10',
      'YL',
      'YL',
    ],
    ['Llanbrynmorgan-Ffynnonwen, Gwenllian', 'LLANBRYNMORGAN-FFYNNONWEN', '11', 'YM', 'YM'],
  ]),
  'formulas.csv': write([
    ['Name', 'Number', 'Size', 'Note'],
    ['Vane, Tilly', '4', 'YM', '=HYPERLINK("https://tern.example/","see here")'],
    ['Quill, Ana', '=3+4', 'YL', '+44 20 7946 0000'],
    ['-Tarn, Bo', '10', 'YM', '@SUM(1,1)'],
    ['Marl, Zoë', '11', 'YS', '-5'],
    ["O'Carrow, Dilys", '12', 'YS', "'=1+1"],
    ['Ostrow, Bex', '13', 'YL', '＝1+1'],
  ]),
  'right-to-left.csv': write([
    ['Name', 'Number', 'Size'],
    ['شَاطِئ، ليلان', '٧', 'YM'],
    ['مرجاني, سُهيلة', '١٠', 'YL'],
    ['גבעולי, נועם־ים', '11', 'YS'],
    ['\u200Fכרמלין, שירז', '12', 'YM'],
    ['Tarn, Bo', '\u200E00\u200E', 'YM'],
  ]),
  'no-header.csv': write([
    ['4', 'Tilly Vane', 'YM'],
    ['7', 'Ana Quill', 'YL'],
    ['00', 'Bo Tarn', 'YM'],
    ['10', 'Zoë Marl', 'YS'],
  ]),
  'team-list.csv': write([
    ['Team', 'Division', 'Home colour', 'Home number', 'Away colour', 'Away number', 'Manager e-mail'],
    ['Kittiwakes', 'U12 Mixed', 'navy', 'white', 'White', '#14375e', 'kittiwakes@tern.example'],
    ['Dunlins', 'U12 Mixed', '#1e6b47', '#ffffff', '#f3f0e7', '#1e6b47', 'dunlins@tern.example'],
    ['Turnstones', 'U12 Mixed', 'Brick (#a6321b)', 'white', '', '', 'turnstones@tern.example'],
    ['Pochards', 'U12 Mixed', 'gold', 'black', 'black', 'gold', ''],
    [
      'Whimbrels',
      'U12 Mixed',
      'royal blue',
      'white',
      'silver',
      'black',
      'one@tern.example; two@tern.example',
    ],
    ['Sanderlings', 'U12 Mixed', 'sea mist', 'black', 'white', 'black', 'sanderlings@tern.example'],
    ['Smews', 'U13 Mixed', 'purple', 'white', 'white', 'purple', 'smews@tern.example'],
    ['Knots', 'U12 Mixed', 'teal', 'white', 'white', 'teal', 'knots@tern.example'],
  ]),
};

await mkdir(folder, { recursive: true });
for (const [name, content] of Object.entries(files)) await writeFile(path.join(folder, name), content);
console.log(`${Object.keys(files).length} sample files written to public/samples.`);
