// Source: OWASP Foundation, "CSV Injection" (owasp.org, community pages, Attacks): the characters that start a formula
// = + - @ tab, carriage return and line feed, and the remedy: quotes around the cell, a leading apostrophe, quotes doubled.
import { describe, expect, it } from 'vitest';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { unguardCell } from '@/lib/domain/roster/import/formula-guard';

const cellOf = (text: string): string => writeCsv(['Name'], [[text]]).slice('Name\r\n'.length, -2);

describe('CSV injection, as OWASP describes it', () => {
  it.each(['=', '+', '-', '@', '\t', '\r', '\n'])('neutralises a cell that starts with %j', (first) => {
    expect(cellOf(`${first}SUM(1)`)).toBe(`"'${first}SUM(1)"`);
  });

  it('gives the results of the two worked examples', () => {
    expect(cellOf('=1+2";=1+2')).toBe(`"'=1+2"";=1+2"`);
    expect(cellOf(`=1+2'" ;,=1+2`)).toBe(`"'=1+2'"" ;,=1+2"`);
  });

  it('keeps a separator or a quote inside a cell from starting a new cell that is a formula', () => {
    for (const text of ['a,=1+1', 'a;=1+1', 'a\t=1+1', 'a|=1+1', 'a",=1+1']) {
      const cell = cellOf(text);
      expect(cell.startsWith('"') && cell.endsWith('"')).toBe(true);
      expect(cell.slice(1, -1).replaceAll('""', '')).not.toContain('"');
    }
  });
});

describe('more than OWASP asks (our own cases)', () => {
  it.each([
    '\uFF1D1+1',
    '\uFF0B1',
    '\uFF0D1',
    '\uFF20SUM(1)',
    ' =1+1',
    '\u00A0=1+1',
    "=cmd|'/c calc'!A0",
    '+44 20 7946 0000',
    '-Smith',
  ])('neutralises %j and reads it back as it was', (text) => {
    const written = cellOf(text);
    expect(written.startsWith(`"'`)).toBe(true);
    expect(unguardCell(written.slice(1, -1))).toBe(text);
  });

  it.each(["O'Neill", "d'Alembert", "'Alembert", '7', '00', 'Vane-Marl', 'a=b', '5-6'])(
    'leaves %j as it is',
    (text) => {
      expect(cellOf(text)).toBe(text);
      expect(unguardCell(text)).toBe(text);
    },
  );
});
