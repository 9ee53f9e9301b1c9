import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  guessMapping,
  type ColumnMapping,
  type ColumnTarget,
} from '@/lib/domain/roster/import/column-mapping';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import { rosterLineSchema } from '@/lib/domain/roster/player';
import { garments } from '../../../../factories/garments';

const rowsOf = (text: string): string[][] => text.split('\n').map((row) => row.split(';'));
const read = (text: string, mapping?: ColumnMapping) => {
  const rows = rowsOf(text);
  return readRoster(rows, mapping ?? guessMapping(rows, garments), garments);
};

describe('readRoster', () => {
  it('puts every cell where its column says, and keeps what no column names', () => {
    const { lines, refused } = read(
      'First name;Last name;No;Role;Size;Parent\n Tilly ;Vane;7;captain;Youth Medium;Jo Vane',
    );
    expect(refused).toEqual([]);
    expect(lines).toEqual([
      {
        rowNumber: 2,
        line: {
          name: 'Vane, Tilly',
          nameOnBack: '',
          number: '7',
          role: 'captain',
          sizes: { 'home-shirt': 'YM', shorts: 'YM' },
        },
        extra: { Parent: 'Jo Vane' },
        notes: ['Home shirt: “Youth Medium” was read as YM.', 'Shorts: “Youth Medium” was read as YM.'],
      },
    ]);
  });

  it.each([
    ['7', '7'],
    ['07', '07'],
    ['0', '0'],
    ['00', '00'],
    ['7.0', '7'],
    ['No. 7', '7'],
    ['#07', '07'],
    ['٧', '7'],
    ['１２', '12'],
    ['seven', 'seven'],
    ['7 or 9', '7 or 9'],
    ['', ''],
  ])('keeps the number %j as %j', (typed, kept) => {
    const { lines } = read(`Name;Number\nAna Quill;${typed}`);
    expect(lines[0]?.line.number).toBe(kept);
    expect(lines[0]?.notes).toHaveLength(typed === kept ? 0 : 1);
  });

  it('keeps sizes it cannot match as they were typed, for the check to show', () => {
    const { lines } = read('Name;Number;Shorts\nAna Quill;7;enormous');
    expect(lines[0]?.line.sizes).toEqual({ shorts: 'enormous' });
  });

  it('lists totals and repeated headings with the reason, but not a player of that name', () => {
    const { lines, refused } = read(
      'Last name;First name;No\nQuill;Ana;7\nTotal;;1\nLast name;First name;No\nTotal;Bo;8\nTotals: 2;;',
    );
    expect(lines.map(({ line }) => line.name)).toEqual(['Quill, Ana', 'Total, Bo']);
    expect(refused.map(({ rowNumber, reason }) => [rowNumber, reason.slice(0, 28)])).toEqual([
      [3, 'This row looks like a total,'],
      [4, 'This row repeats the heading'],
      [6, 'This row looks like a total,'],
    ]);
    expect(refused[0]?.cells).toEqual(['Total', '', '1']);
  });

  it('refuses a row with an entry over its limit, naming the entry and both lengths, and cuts nothing', () => {
    const { lines, refused } = read(
      `Name;Number;Note\n${'a'.repeat(121)};7;\nBo Tarn;8;${'b'.repeat(501)}\nCy;9;`,
    );
    expect(lines.map(({ line }) => line.name)).toEqual(['Cy']);
    expect(refused[0]?.reason).toContain('The name has 121 characters and the most is 120.');
    expect(refused[1]?.reason).toContain('The Note has 501 characters and the most is 500.');
    expect(refused[0]?.cells[0]).toHaveLength(121);
  });

  it('takes names of one letter, of 80 letters, right-to-left names and combining marks', () => {
    const names = ['Ö', 'N'.repeat(80), 'שירה לבן', 'ليلى حداد', 'Siân Tarn', 'Nguyễn Thị', '𠮷野 葵'];
    const { lines } = read(
      `Name;Number\n${names.map((name, at) => `${name.normalize('NFD')};${at}`).join('\n')}`,
    );
    expect(lines.map(({ line }) => line.name)).toEqual(names.map((name) => name.normalize('NFC')));
  });

  it('takes out what nobody can see, says so, and keeps no half characters or zero bytes', () => {
    const { lines } = read('Name;Number\n\u202EAna\u200B Quill\u0000;7\nBo\uD800;8');
    expect(lines.map(({ line }) => line.name)).toEqual(['Ana Quill', 'Bo\uFFFD']);
    expect(lines[0]?.notes).toEqual(['Name: Characters that cannot be seen were taken out.']);
    expect(lines[1]?.notes[0]).toContain('Half a character');
  });

  it('keeps a cell that looks like a formula as text and says so; a name with a hyphen is nothing to speak of', () => {
    const { lines } = read('Name;Number\n=1+1;7\n-Tarn;8');
    expect(lines.map(({ line, notes }) => [line.name, notes.length])).toEqual([
      ['=1+1', 1],
      ['-Tarn', 0],
    ]);
  });

  it('leaves out a column only when told to, and names it', () => {
    const columns: ColumnTarget[] = [{ field: 'name' }, { field: 'leave out' }];
    const reading = read('Name;Phone\nAna Quill;555 0101', { headerRow: 0, columns });
    expect(reading.leftOut).toEqual(['Phone']);
    expect(reading.lines[0]?.extra).toEqual({});
    expect(reading.notes).toEqual(['No column was matched with the number.']);
  });

  it('keeps cells beyond the headings, and headings that are words of the language itself', () => {
    const { lines } = read('Name;Number;__proto__;constructor\nAna Quill;7;a;b;c');
    expect(Object.entries(lines[0]?.extra ?? {})).toEqual([
      ['__proto__', 'a'],
      ['constructor', 'b'],
      ['Column 5', 'c'],
    ]);
  });

  it('lists a row that has nothing in the matched columns', () => {
    const { refused } = read('Name;Number;Note\n;;bring the cones');
    expect(refused[0]?.reason).toContain('nothing in the columns that were matched');
  });

  it('accounts for every row of any table under any mapping, and every line fits the stored schema', () => {
    const cell = fc.oneof(
      fc.constantFrom('', ' ', 'Name', 'Number', 'Total', '7', '00', 'YM', 'Ana Quill', 'a'.repeat(130)),
      fc.string({ unit: 'binary', maxLength: 10 }),
    );
    const target: fc.Arbitrary<ColumnTarget> = fc.oneof(
      fc
        .constantFrom('name', 'firstName', 'lastName', 'nameOnBack', 'number', 'role')
        .map((field) => ({ field })),
      fc.constant<ColumnTarget>({ field: 'size', garments: ['home-shirt'] }),
      fc.constantFrom<ColumnTarget[]>({ field: 'extra' }, { field: 'leave out' }),
    );
    const mapping = fc.record({
      headerRow: fc.option(fc.nat(12)),
      columns: fc.array(target, { maxLength: 6 }),
    });
    fc.assert(
      fc.property(
        fc.array(fc.array(cell, { maxLength: 6 }), { maxLength: 12 }),
        fc.option(mapping),
        (rows, chosen) => {
          const { lines, refused, counts } = readRoster(
            rows,
            chosen ?? guessMapping(rows, garments),
            garments,
          );
          expect(counts.rows).toBe(rows.length);
          expect(counts.lines + counts.refused + counts.blank + counts.headings + counts.aboveHeadings).toBe(
            rows.length,
          );
          expect([counts.lines, counts.refused]).toEqual([lines.length, refused.length]);
          const numbers = [...lines, ...refused].map(({ rowNumber }) => rowNumber);
          expect(new Set(numbers).size).toBe(numbers.length);
          for (const { cells, rowNumber } of refused) expect(cells).toEqual(rows[rowNumber - 1]);
          for (const { line } of lines) expect(rosterLineSchema.safeParse(line).success).toBe(true);
        },
      ),
      { numRuns: 1000 },
    );
  });
});
