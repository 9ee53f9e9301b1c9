import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseTable, type Table } from '@/lib/domain/roster/import/parse-table';

const read = (text: string): Table => {
  const result = parseTable(text);
  if (!result.ok) throw new Error(result.message);
  return result.table;
};

describe('parseTable', () => {
  it.each([
    [',', 'CRLF', '\r\n'],
    [';', 'LF', '\n'],
    ['\t', 'CR', '\r'],
    ['|', 'LF', '\n'],
  ] as const)('finds the separator %j and the line end %s', (delimiter, lineEnd, newline) => {
    const rows = [
      ['Name', 'Number', 'Size'],
      ['Ana Quill', '0', 'YM'],
      ['Bo Tarn', '00', 'M'],
    ];
    const table = read(rows.map((row) => row.join(delimiter)).join(newline) + newline);
    expect(table).toMatchObject({ rows, delimiter, lineEnd, blankRows: 0, problems: [], notes: [] });
  });

  it('takes the semicolon when commas stand inside names', () => {
    expect(read('Vane, Tilly;7\nOstrow, Bex;8\n')).toMatchObject({
      delimiter: ';',
      rows: [
        ['Vane, Tilly', '7'],
        ['Ostrow, Bex', '8'],
      ],
    });
  });

  it('finds the separator below title lines that have none', () => {
    expect(read('Otters, spring\n\nName;Number;Size\nAna;7;M\nBo;8;M\n').delimiter).toBe(';');
  });

  it('reads cells pasted from a spreadsheet, line ends inside quotes included', () => {
    expect(read('Name\tNote\n"Ana\nQuill"\t"says ""hi"""\nBo\t\n').rows).toEqual([
      ['Name', 'Note'],
      ['Ana\nQuill', 'says "hi"'],
      ['Bo', ''],
    ]);
  });

  it('keeps blank rows in their place and counts them, so that row numbers stay those of the file', () => {
    const table = read('Name,Number\n\nAna,7\n,\n\nBo,8\n');
    expect(table.rows.map((row) => row.join())).toEqual(['Name,Number', '', 'Ana,7', ',', '', 'Bo,8']);
    expect(table.blankRows).toBe(3);
  });

  it('keeps every cell of rows that are longer or shorter, and says which they are', () => {
    const table = read('Name,Number\nAna,7,M,extra\nBo\nCy,9\n');
    expect(table.rows).toEqual([['Name', 'Number'], ['Ana', '7', 'M', 'extra'], ['Bo'], ['Cy', '9']]);
    expect(table.notes).toEqual([
      'Most rows have 2 cells; rows 2, 3 have another number of them. All cells were kept.',
    ]);
  });

  it('reads each kind of line end as one when a file mixes them, and says so', () => {
    const table = read('Name,Number\r\nAna,7\rBo,8\nCy,9');
    expect(table.rows.map(([name]) => name)).toEqual(['Name', 'Ana', 'Bo', 'Cy']);
    expect(table.lineEnd).toBe('mixed');
    expect(table.notes.join()).toContain('mixes several kinds of line end');
  });

  it('does not let a quotation mark without a partner swallow the rows below', () => {
    const table = read('Name,Number\n"Ana,7\nBo "Bee" Tarn,8\n"Cy, the tall",9\nDi,10"\n"Ed" x,11\n');
    expect(table.rows).toEqual([
      ['Name', 'Number'],
      ['"Ana', '7'],
      ['Bo "Bee" Tarn', '8'],
      ['Cy, the tall', '9'],
      ['Di', '10"'],
      ['"Ed" x', '11'],
    ]);
    expect(table.problems.map(({ rowNumber }) => rowNumber)).toEqual([2, 6]);
  });

  it('goes on without regard to quotes when very many have no partner, keeping every row', () => {
    const table = read('Name,Number\n' + '"Ana,7\n'.repeat(200));
    expect(table.rows).toHaveLength(201);
    expect(table.rows.at(-1)).toEqual(['"Ana', '7']);
    expect(table.problems).toHaveLength(51);
    expect(table.problems.at(-1)?.message).toContain('From this row on');
  });

  it('refuses 50,000 rows, and a file of line ends, with their number', () => {
    expect(parseTable('Name,Number\n' + 'Ana,7\n'.repeat(50_000))).toMatchObject({
      ok: false,
      code: 'too-many-rows',
      message: expect.stringContaining('50,000 rows and the most is 2,000') as string,
    });
    expect(parseTable(`A${'\n'.repeat(1_000_000)}`)).toMatchObject({ ok: false, code: 'too-many-rows' });
  });

  it('reads 2,000 rows below title and headings, and refuses 2,001', () => {
    expect(parseTable('Otters\nName,Number\n' + 'Ana,7\n'.repeat(2000)).ok).toBe(true);
    expect(parseTable('Otters\nName,Number\n' + 'Ana,7\n'.repeat(2001)).ok).toBe(false);
    expect(parseTable('Ana,7\n'.repeat(2000)).ok).toBe(true);
    expect(parseTable('Ana,7\n'.repeat(2001)).ok).toBe(false);
  });

  it('refuses more than 100 columns, but not empty cells behind the last one', () => {
    expect(parseTable(Array.from({ length: 101 }, (_, at) => `c${at}`).join())).toMatchObject({
      ok: false,
      code: 'too-many-columns',
    });
    expect(read(`Name,Number${','.repeat(300)}\nAna,7${','.repeat(300)}`).rows[1]?.slice(0, 2)).toEqual([
      'Ana',
      '7',
    ]);
  });

  it('refuses no text at all', () => {
    for (const text of ['', ' \n ', '\uFEFF'])
      expect(parseTable(text)).toMatchObject({ ok: false, code: 'empty' });
  });

  it('answers for any text, and loses no letter of it but separators, quotes and line ends', () => {
    const piece = fc.constantFrom(
      'a',
      'Ω',
      ',',
      ';',
      '\t',
      '|',
      '"',
      '""',
      '\n',
      '\r',
      '\r\n',
      ' ',
      '7',
      "'",
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 60 }), (pieces) => {
        const text = pieces.join('');
        const result = parseTable(text);
        if (!result.ok) {
          expect(text.trim()).toBe('');
          return;
        }
        const letters = (from: string): string => from.replace(/[^aΩ7]/g, '');
        expect(letters(result.table.rows.flat().join(''))).toBe(letters(text));
      }),
      { numRuns: 2000 },
    );
  });
});
