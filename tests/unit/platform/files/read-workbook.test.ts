import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readWorkbook, type WorkbookResult } from '@/lib/platform/files/read-workbook';
import {
  lieAboutSizes,
  makeBareWorkbook,
  makeCompoundFile,
  makeSheet,
  makeWorkbook,
  makeZip,
  replaceInZip,
} from '../../../factories/workbooks';

const sheetsOf = (result: WorkbookResult) => {
  if (!result.ok) throw new Error(result.message);
  return result.sheets;
};
const codeOf = (result: WorkbookResult): string => (result.ok ? 'ok' : result.code);
const messageOf = (result: WorkbookResult): string => (result.ok ? '' : result.message);

describe('readWorkbook reads cells as people see them', () => {
  it('gives numbers as labels, dates as ISO text, truth values in words and keeps every cell in its place', async () => {
    const bytes = await makeSheet([
      ['Name', 'Number', 'Born', 'Paid'],
      ['Vane, Tilly', 7, new Date(Date.UTC(2014, 8, 3)), true],
      [],
      ['Ostrow, Bex', '00', null, false],
      [null, 12.5, new Date(Date.UTC(2014, 8, 3, 9, 5)), null],
    ]);
    const [sheet] = sheetsOf(await readWorkbook(bytes));
    expect(sheet?.name).toBe('Roster');
    expect(sheet?.rows).toEqual([
      ['Name', 'Number', 'Born', 'Paid'],
      ['Vane, Tilly', '7', '2014-09-03', 'TRUE'],
      ['', '', '', ''],
      ['Ostrow, Bex', '00', '', 'FALSE'],
      ['', '12.5', '2014-09-03T09:05', ''],
    ]);
    expect(sheet?.notes.join(' ')).toContain('2 cells (C2 and others) hold dates');
  });

  it('keeps rows in their place when the sheet starts further down', async () => {
    const bytes = await makeSheet([[], [], ['Name', 'Number'], ['Ana Quill', 3]]);
    const rows = sheetsOf(await readWorkbook(bytes))[0]?.rows;
    expect(rows?.map((row) => row[0] ?? '')).toEqual(['', '', 'Name', 'Ana Quill']);
  });

  it('reads a 7 that is shown as 07 as 07, and a 0 shown as 00 as 00', async () => {
    const bytes = await makeWorkbook([
      {
        name: 'Roster',
        rows: [
          ['Name', 'Number'],
          ['A', 7],
          ['B', 0],
          ['C', 12],
        ],
        formats: { B: '00' },
      },
    ]);
    expect(sheetsOf(await readWorkbook(bytes))[0]?.rows.map((row) => row[1])).toEqual([
      'Number',
      '07',
      '00',
      '12',
    ]);
  });

  it('joins rich text, keeps outer spaces, scripts, and characters outside the first plane', async () => {
    const bytes = await makeSheet([
      ['Name', 'Note'],
      [
        { richText: [{ text: 'Zo' }, { text: 'ë', font: { bold: true } }, { text: ' Marl' }] },
        ' two  spaces ',
      ],
      ['שירה לבן', 'ليلى & <b>'],
      ['𠮷野', '"quoted"'],
    ]);
    expect(sheetsOf(await readWorkbook(bytes))[0]?.rows.slice(1)).toEqual([
      ['Zoë Marl', ' two  spaces '],
      ['שירה לבן', 'ليلى & <b>'],
      ['𠮷野', '"quoted"'],
    ]);
  });

  it('takes the stored result of a formula, shows a formula without one, and says both', async () => {
    const bytes = await makeSheet([
      ['Name', 'Number', 'Link'],
      [
        'Ana Quill',
        { formula: '3+4', result: 7 },
        { formula: 'HYPERLINK("https://example.test","go")', result: 'go' },
      ],
      ['Bo Tarn', { formula: 'B2&""&1' }, { formula: 'NA()', result: { error: '#N/A' } }],
    ]);
    const [sheet] = sheetsOf(await readWorkbook(bytes));
    expect(sheet?.rows.slice(1)).toEqual([
      ['Ana Quill', '7', 'go'],
      ['Bo Tarn', '=B2&""&1', '#N/A'],
    ]);
    expect(sheet?.notes.join(' ')).toContain('not worked out again');
    expect(sheet?.notes.join(' ')).toContain('In 1 cell (B3) the file holds no result');
    expect(sheet?.notes.join(' ')).toContain('In 1 cell (C3) the spreadsheet shows an error');
  });

  it('reads several sheets, leaves empty ones aside and names hidden ones it did not read', async () => {
    const bytes = await makeWorkbook([
      { name: 'Otters', rows: [['Name'], ['Ana Quill']] },
      { name: 'Empty', rows: [] },
      { name: 'Lists', rows: [['YM'], ['YL']], hidden: true },
      { name: 'Herons', rows: [['Name'], ['Bo Tarn']] },
    ]);
    const result = await readWorkbook(bytes);
    expect(sheetsOf(result).map(({ name }) => name)).toEqual(['Otters', 'Herons']);
    expect(result.ok && result.notes.join(' ')).toContain('Sheet “Lists” was left out: it is hidden.');
  });

  it('takes off the apostrophe that our own export put before a formula', async () => {
    const bytes = await makeSheet([['Name'], ["'=1+1"], ["'Alembert, Jo"]]);
    expect(sheetsOf(await readWorkbook(bytes))[0]?.rows).toEqual([['Name'], ['=1+1'], ["'Alembert, Jo"]]);
  });

  it('does not follow links to other workbooks', async () => {
    const plain = await makeSheet([['Name'], [{ formula: "'[other.xlsx]Sheet1'!A1", result: 'Ana Quill' }]]);
    const bytes = await replaceInZip(plain, 'xl/externalLinks/externalLink1.xml', () => '<externalLink/>');
    expect(sheetsOf(await readWorkbook(bytes))[0]?.rows).toEqual([['Name'], ['Ana Quill']]);
  });
});

describe('readWorkbook refuses by name and says what to do', () => {
  it('refuses 50,000 rows with their number', async () => {
    const bytes = await makeSheet([
      ['Name', 'Number'],
      ...Array.from({ length: 50_000 }, (_, at) => [`P${at}`, at % 100]),
    ]);
    const result = await readWorkbook(bytes);
    expect(codeOf(result)).toBe('too-many-rows');
    expect(messageOf(result)).toContain('50,001 rows, headings included,');
  });

  it('reads 2,000 rows and refuses 2,001', async () => {
    const rows = (count: number) => [
      ['Name', 'Number'],
      ...Array.from({ length: count }, (_, at) => [`P${at}`, 1]),
    ];
    expect(codeOf(await readWorkbook(await makeSheet(rows(2000))))).toBe('ok');
    const result = await readWorkbook(await makeSheet(rows(2001)));
    expect(codeOf(result)).toBe('too-many-rows');
    expect(messageOf(result)).toContain('2,001 rows');
  });

  it('reads the sheet that fits and names the one that does not', async () => {
    const long = Array.from({ length: 3000 }, (_, at) => [`P${at}`]);
    const bytes = await makeWorkbook([
      { name: 'Everyone', rows: long },
      { name: 'Otters', rows: [['Name'], ['Ana Quill']] },
    ]);
    const result = await readWorkbook(bytes);
    expect(sheetsOf(result).map(({ name }) => name)).toEqual(['Otters']);
    expect(result.ok && result.notes.join(' ')).toContain(
      'Sheet “Everyone” was left out: This list has 3,000 rows',
    );
  });

  it('refuses a cell far to the right or far down instead of filling the space between', async () => {
    const cell = (at: string) =>
      `<worksheet><sheetData><row r="${/\d+/.exec(at)?.[0]}"><c r="${at}"><v>1</v></c></row></sheetData></worksheet>`;
    expect(codeOf(await readWorkbook(await makeBareWorkbook(cell('A2'))))).toBe('ok');
    expect(codeOf(await readWorkbook(await makeBareWorkbook(cell('XFD1'))))).toBe('too-many-columns');
    expect(codeOf(await readWorkbook(await makeBareWorkbook(cell('A1048576'))))).toBe('too-many-rows');
    expect(codeOf(await readWorkbook(await makeBareWorkbook(cell('A999999999'))))).toBe('damaged');
  });

  it.each([
    ['twice the place', '<row r="1"><c r="A1" r="A900000"><v>1</v></c></row>'],
    ['the place hidden behind a bracket', '<row r="1"><c s="a>b" r="A900000"><v>1</v></c></row>'],
    ['the place in character references', '<row r="1"><c r="A&#57;&#57;"><v>1</v></c></row>'],
    ['a row number that is none', '<row r="1e9"><c r="A1"><v>1</v></c></row>'],
    ['a document type', '<!DOCTYPE x [<!ENTITY a "b">]><row r="1"><c r="A1"><v>1</v></c></row>'],
    ['a cell that never ends', '<row r="1"><c r="A1"><v>1</v>'],
    ['no such text', '<row r="1"><c r="A1" t="s"><v>99</v></c></row>'],
  ])('refuses a sheet with %s as damaged', async (_, data) => {
    const bytes = await makeBareWorkbook(`<worksheet><sheetData>${data}</sheetData></worksheet>`);
    expect(codeOf(await readWorkbook(bytes))).toBe('damaged');
  });

  it('refuses a workbook that unpacks to far more than it weighs, before unpacking it', async () => {
    const bytes = await makeBareWorkbook(`<worksheet><sheetData/></worksheet>${' '.repeat(3_000_000)}`);
    expect(bytes.length).toBeLessThan(6_000);
    expect(codeOf(await readWorkbook(bytes))).toBe('unpacks-too-large');
  });

  it('stops unpacking when the directory lies about how much there is', async () => {
    const bytes = await makeBareWorkbook(`<worksheet><sheetData/></worksheet>${' '.repeat(3_000_000)}`);
    expect(codeOf(await readWorkbook(lieAboutSizes(bytes, 100)))).toBe('unpacks-too-large');
  });

  it('refuses an archive with too many parts', async () => {
    const files = Object.fromEntries(Array.from({ length: 2001 }, (_, at) => [`xl/p${at}.xml`, '']));
    expect(codeOf(await readWorkbook(await makeZip(files)))).toBe('unpacks-too-large');
  });

  it('refuses macros, passwords and old formats, each by its name', async () => {
    const macro = await replaceInZip(await makeSheet([['Name']]), 'xl/vbaProject.bin', () => 'x');
    expect(messageOf(await readWorkbook(macro))).toContain('macros');
    expect(codeOf(await readWorkbook(macro))).toBe('macro-workbook');
    expect(codeOf(await readWorkbook(makeCompoundFile('EncryptedPackage')))).toBe('password-protected');
    const old = await readWorkbook(makeCompoundFile('Workbook'));
    expect(codeOf(old)).toBe('old-workbook');
    expect(messageOf(old)).toContain('.xlsx');
  });

  it('refuses an archive whose files are encrypted', async () => {
    const bytes = (await makeSheet([['Name']])).slice();
    const view = new DataView(bytes.buffer);
    for (let at = 0; at + 46 < bytes.length; at += 1) {
      if (view.getUint32(at, true) === 0x02014b50) view.setUint16(at + 8, 1, true);
    }
    expect(codeOf(await readWorkbook(bytes))).toBe('password-protected');
  });

  it('refuses an empty workbook and a file over 5 MB', async () => {
    expect(codeOf(await readWorkbook(await makeSheet([])))).toBe('empty');
    expect(codeOf(await readWorkbook(new Uint8Array(5 * 1024 * 1024 + 1)))).toBe('too-large');
  });
});

describe('readWorkbook never throws', () => {
  it('answers for any bytes behind the signature of an archive', async () => {
    await fc.assert(
      fc.asyncProperty(fc.uint8Array({ maxLength: 300 }), async (tail) => {
        const result = await readWorkbook(Uint8Array.from([0x50, 0x4b, 0x03, 0x04, ...tail]));
        expect(result.ok).toBe(false);
      }),
    );
  });

  it('answers for a workbook with any of its bytes changed, or cut off anywhere', async () => {
    const whole = await makeSheet([
      ['Name', 'Number'],
      ['Ana Quill', 7],
      ['Bo Tarn', { formula: '1+1' }],
    ]);
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.tuple(fc.nat(whole.length - 1), fc.nat(255)), { maxLength: 8 }),
        fc.nat(whole.length),
        async (changes, cut) => {
          const bytes = whole.slice();
          for (const [at, value] of changes) bytes[at] = value;
          const results = [await readWorkbook(bytes), await readWorkbook(bytes.subarray(0, cut))];
          for (const result of results) if (!result.ok) expect(result.message).toMatch(/^[A-Z].*\.$/s);
        },
      ),
      { numRuns: 150 },
    );
  });
});
