import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  columnMappingSchema,
  guessMapping,
  reuseMapping,
  type ColumnMapping,
} from '@/lib/domain/roster/import/column-mapping';
import { findHeadingRow, headingSignature, listHeadings } from '@/lib/domain/roster/import/find-headings';
import { garments } from '../../../../factories/garments';

const rowsOf = (text: string): string[][] => text.split('\n').map((row) => row.split(';'));

/** A mapping in few words: `1: name number size(home-shirt) extra`. */
const tell = ({ headerRow, columns }: ColumnMapping): string =>
  `${headerRow ?? '-'}: ${columns.map((target) => (target.field === 'size' ? `size(${target.garments.join('+')})` : target.field)).join(' ')}`;
const guess = (text: string): string => tell(guessMapping(rowsOf(text), garments));

describe('guessMapping', () => {
  it.each([
    ['plain headings', 'Name;Number;Role\nAna Quill;7;captain', '0: name number role'],
    ['abbreviations', 'PLAYER;No.;Pos\nAna Quill;7;', '0: name number role'],
    ['a number sign', 'First name;Last name;#\nAna;Quill;7', '0: firstName lastName number'],
    [
      'German',
      'Vorname;Nachname;Rückennummer;Größe\nZoë;Marl;7;M',
      '0: firstName lastName number size(home-shirt+shorts)',
    ],
    ['a full name beside the first name', 'Full name;First name;No\nAna Quill;Ana;7', '0: name extra number'],
    ['a name that is the last name', 'Vorname;Name;Nr\nZoë;Marl;7', '0: firstName lastName number'],
    [
      'French',
      'Prénom;Nom;Numéro;Taille\nZoé;Marl;7;M',
      '0: firstName lastName number size(home-shirt+shorts)',
    ],
    [
      'Spanish',
      'Nombre;Apellidos;Dorsal;Talla\nAna;Peña;7;M',
      '0: firstName lastName number size(home-shirt+shorts)',
    ],
    [
      'a whole name beside its parts',
      'Name;First;Last;No\nAna Quill;Ana;Quill;7',
      '0: name extra extra number',
    ],
    [
      'garments by name',
      'Name;Number;Home shirt size;Shorts\nAna Quill;7;M;M',
      '0: name number size(home-shirt) size(shorts)',
    ],
    [
      'another word for the garment',
      'Name;Number;Jersey size\nAna Quill;7;M',
      '0: name number size(home-shirt)',
    ],
    [
      'two columns called size',
      'Name;Number;Size;Size\nAna Quill;7;M;M',
      '0: name number size(home-shirt) size(shorts)',
    ],
    ['the same heading twice', 'Name;Number;Number\nAna Quill;7;8', '0: name number extra'],
    [
      'titles and blank rows above',
      'Otters;;\n;;\nSpring 2027;;\nName;Number;Size\nAna;7;M',
      '3: name number size(home-shirt+shorts)',
    ],
    [
      'columns that only sound alike',
      'Name;Number;Phone number;Member no\nAna Quill;7;555 0101;88',
      '0: name number extra extra',
    ],
    ['the name on the back', 'Name;Name on back;No\nAna Quill;QUILL;7', '0: name nameOnBack number'],
    ['no headings at all', 'Ana Quill;7;YM\nBo Tarn;8;M', '-: name number size(home-shirt+shorts)'],
    ['no headings, names in two columns', '7;Ana;Quill\n00;Bo;Tarn', '-: number firstName lastName'],
    [
      'headings in words we do not know',
      'Pelaaja;Pelinro;Koko\nAna Quill;7;YM\nBo Tarn;8;M',
      '0: name number size(home-shirt+shorts)',
    ],
    ['one column of names', 'Ana Quill\nBo Tarn', '-: name'],
    ['a heading over one column', 'Players\nAna Quill\nBo Tarn', '0: name'],
  ])('reads %s', (_, text, expected) => {
    expect(guess(text)).toBe(expected);
  });

  it('never guesses that a column is to be left out, and always gives a mapping the schema takes', () => {
    const cell = fc.oneof(
      fc.constantFrom(
        'Name',
        'First name',
        'Last',
        'No',
        'Size',
        'Shorts',
        '7',
        'YM',
        'Ana',
        'Ana Quill',
        '',
      ),
      fc.string({ maxLength: 6 }),
    );
    fc.assert(
      fc.property(fc.array(fc.array(cell, { maxLength: 7 }), { maxLength: 8 }), (rows) => {
        const mapping = guessMapping(rows, garments);
        expect(columnMappingSchema.safeParse(mapping).success).toBe(true);
        expect(mapping.columns).toHaveLength(Math.max(0, ...rows.map((row) => row.length)));
        expect(mapping.columns.some(({ field }) => field === 'leave out')).toBe(false);
      }),
      { numRuns: 500 },
    );
  });
});

describe('columnMappingSchema', () => {
  const complain = (columns: unknown): string =>
    columnMappingSchema.safeParse({ headerRow: null, columns }).error?.issues[0]?.message ?? '';

  it('asks to choose when two columns are chosen for one thing', () => {
    expect(complain([{ field: 'number' }, { field: 'number' }])).toBe(
      'Two columns are chosen for the number. Choose one of them.',
    );
    expect(
      complain([
        { field: 'size', garments: ['shorts'] },
        { field: 'size', garments: ['shorts'] },
      ]),
    ).toContain('the same size');
    expect(complain([{ field: 'name' }, { field: 'firstName' }])).toContain('not both');
    expect(
      complain([{ field: 'extra' }, { field: 'extra' }, { field: 'leave out' }, { field: 'leave out' }]),
    ).toBe('');
  });
});

describe('headings', () => {
  it('are numbered when they come again, and said to be', () => {
    const { headings, notes } = listHeadings([['Size', '', 'size', 'Size 2', 'Size']], 0);
    expect(headings).toEqual(['Size', 'Column 2', 'size 2', 'Size 2 2', 'Size 3']);
    expect(new Set(headings.map((heading) => heading.toLowerCase())).size).toBe(headings.length);
    expect(notes.join()).toContain('columns are called “');
  });

  it('are not looked for in rows with numbers, nor below ten title lines', () => {
    expect(
      findHeadingRow([
        ['Ana', '7'],
        ['Name', 'Number'],
      ]),
    ).toBe(1);
    expect(
      findHeadingRow([...Array.from({ length: 10 }, (_, at) => [`title ${at}`]), ['Name', 'Number']]),
    ).toBe(10);
    expect(
      findHeadingRow([...Array.from({ length: 11 }, (_, at) => [`title ${at}`]), ['Name', 'Number']]),
    ).toBeNull();
  });

  it('are never a row of data that happens to hold a heading word', () => {
    expect(
      findHeadingRow([
        ['Last', '7'],
        ['Quill', '8'],
      ]),
    ).toBeNull();
  });

  it('have one signature whatever their case, accents and punctuation', () => {
    expect(headingSignature(['Name', 'No.', 'Größe'])).toBe(
      headingSignature(['NAME ', 'no', 'Grösse'.replace('ss', 'ß')]),
    );
    expect(headingSignature(['Name', 'No'])).not.toBe(headingSignature(['No', 'Name']));
    expect(headingSignature(['', ' '])).toBe('');
  });
});

describe('reuseMapping', () => {
  const remembered: ColumnMapping = {
    headerRow: 0,
    columns: [{ field: 'name' }, { field: 'leave out' }, { field: 'size', garments: ['shorts', 'socks'] }],
  };

  it('fits a kept mapping to a file whose headings stand elsewhere and a kit that lost a garment', () => {
    const rows = rowsOf('Otters;;\nName;Number;Size\nAna;7;M');
    expect(reuseMapping(remembered, rows, garments)).toEqual({
      headerRow: 1,
      columns: [{ field: 'name' }, { field: 'leave out' }, { field: 'size', garments: ['shorts'] }],
    });
  });

  it('gives nothing for a table with another number of columns', () => {
    expect(reuseMapping(remembered, rowsOf('Name;Number\nAna;7'), garments)).toBeNull();
  });
});
