import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { parseTable } from '@/lib/domain/roster/import/parse-table';

const read = (text: string): string[][] => {
  const result = parseTable(text, { delimiter: ',' });
  if (!result.ok) throw new Error(result.message);
  return result.table.rows;
};

describe('writeCsv', () => {
  it('ends every row with CR LF and quotes only what needs it', () => {
    expect(
      writeCsv(
        ['Name', 'Number'],
        [
          ['Vane, Tilly', '07'],
          ['Bo "Bee" Tarn', '00'],
        ],
      ),
    ).toBe('Name,Number\r\n"Vane, Tilly",07\r\n"Bo ""Bee"" Tarn",00\r\n');
  });

  it('leaves typed numbers bare, also negative ones, and labels untouched', () => {
    expect(
      writeCsv(
        ['Gap', 'Label'],
        [
          [-5, '7'],
          [0.5, '0'],
          [null, '00'],
        ],
      ),
    ).toBe('Gap,Label\r\n-5,7\r\n0.5,0\r\n,00\r\n');
  });

  it('starts with a byte-order mark when asked', () => {
    expect(writeCsv(['A'], [], { byteOrderMark: true })).toBe('\uFEFFA\r\n');
    expect(writeCsv(['A'], [])).toBe('A\r\n');
  });

  it('writes a number that is not finite as text', () => {
    expect(writeCsv(['A'], [[Number.NaN], [Number.NEGATIVE_INFINITY]])).toBe('A\r\nNaN\r\n"\'-Infinity"\r\n');
  });

  it('gives back every cell that was written, whatever is in it', () => {
    const nasty = fc.constantFrom(
      '=1+1',
      "'=1",
      "''-x",
      '-5',
      ' =a',
      '\t',
      '\r\n',
      '"',
      ',',
      ';',
      "O'Neill",
      "'",
      '＝1',
      '00',
      '',
    );
    const cell = fc.oneof(fc.string({ unit: 'binary', maxLength: 12 }), fc.string({ maxLength: 8 }), nasty);
    const row = fc.array(cell, { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(row, fc.array(row, { maxLength: 8 }), (headings, rows) => {
        fc.pre([headings, ...rows].some((cells) => cells.some((text) => text.trim() !== '')));
        expect(read(writeCsv(headings, rows))).toEqual([headings, ...rows]);
      }),
      { numRuns: 1000 },
    );
  });
});
