// Source: WHATWG, Encoding Standard (encoding.spec.whatwg.org), indexes of windows-1252, windows-1250, windows-1254,
// iso-8859-2 and macintosh, and section 6 on byte-order marks. Bytes are written out here, not made by a decoder.
import { describe, expect, it } from 'vitest';
import {
  decodeText,
  decodeTextAs,
  type DecodeResult,
  type EncodingLabel,
} from '@/lib/domain/roster/import/decode-text';
import { parseTable } from '@/lib/domain/roster/import/parse-table';

/** Bytes from text in which {XX} stands for one byte in hexadecimal. */
const bytes = (text: string): Uint8Array =>
  Uint8Array.from(
    (text.match(/\{[0-9A-F]{2}\}|[\s\S]/g) ?? []).map((piece) =>
      piece.length === 4 ? Number.parseInt(piece.slice(1, 3), 16) : piece.charCodeAt(0),
    ),
  );

const utf16 = (text: string, order: 'little' | 'big', mark: boolean): Uint8Array => {
  const units = [
    ...(mark ? [0xfeff] : []),
    ...Array.from({ length: text.length }, (_, at) => text.charCodeAt(at)),
  ];
  return Uint8Array.from(
    units.flatMap((unit) => (order === 'little' ? [unit & 255, unit >> 8] : [unit >> 8, unit & 255])),
  );
};

const rowsOf = (result: DecodeResult): string[][] => {
  if (!result.ok) throw new Error(result.message);
  const parsed = parseTable(result.text);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.table.rows;
};

const western = [
  ['first', 'last', 'number'],
  ['Zoë', 'Müller-Marl', '10'],
  ['Ana', 'Peña', '00'],
  ['Siân', 'O’Tarn', '0'],
];
const many = [
  ['first', 'last', 'number'],
  ['Łukasz', 'Wójt', '7'],
  ['İlkay', 'Şah', '00'],
  ['Đorđe', 'Ćil', '0'],
  ['Ελένη', 'Παππά', '5'],
];
const manyText = many.map((row) => row.join(',')).join('\r\n');

describe('encodings a file comes in', () => {
  it('reads UTF-8 with and without a byte-order mark, composed letters whichever way they are stored', () => {
    expect(rowsOf(decodeText(new TextEncoder().encode(manyText)))).toEqual(many);
    const marked = decodeText(new TextEncoder().encode(`\uFEFF${manyText}`));
    expect(marked).toMatchObject({ encoding: 'UTF-8 with BOM', sure: true });
    expect(rowsOf(marked)).toEqual(many);
    const plain = decodeText(bytes('Sia{CC}{82}n,0'));
    expect(plain.ok && plain.text.normalize('NFC')).toBe('Siân,0');
  });

  it.each([
    ['little', true, 'UTF-16 LE'],
    ['big', true, 'UTF-16 BE'],
    ['little', false, 'UTF-16 LE'],
    ['big', false, 'UTF-16 BE'],
  ] as const)('reads UTF-16 in %s-endian order (mark: %s)', (order, mark, encoding) => {
    const result = decodeText(utf16(manyText.replaceAll(',', '\t'), order, mark));
    expect(result).toMatchObject({ encoding, sure: true });
    expect(rowsOf(result)).toEqual(many);
  });

  it('reads Windows-1252, with commas or semicolons, and says it is an assumption', () => {
    const text = 'first,last,number\r\nZo{EB},M{FC}ller-Marl,10\r\nAna,Pe{F1}a,00\r\nSi{E2}n,O{92}Tarn,0\r\n';
    for (const separator of [',', ';']) {
      const result = decodeText(bytes(text.replaceAll(',', separator)));
      expect(rowsOf(result)).toEqual(western);
      expect(result).toMatchObject({
        encoding: 'Windows-1252',
        sure: false,
        sample: ['Zoë', 'Müller-Marl', 'Peña', 'Siân', 'O’Tarn'],
      });
    }
  });

  it.each([
    [
      'windows-1250',
      'first,number\n{A3}ukasz W{F3}jt,7\n{8E}an {8A}ari{E6},0\n',
      ['Łukasz Wójt', 'Žan Šarić'],
    ],
    ['iso-8859-2', 'first,number\n{A3}ukasz W{F3}jt,7\n{AE}an {A9}ari{E6},0\n', ['Łukasz Wójt', 'Žan Šarić']],
    ['windows-1254', 'first,number\n{DD}lkay,7\n{DE}ah,0\n', ['İlkay', 'Şah']],
    ['macintosh', 'first,number\rZo{91} M{9F}ller,7\rSi{89}n O{D5}Tarn,0\r', ['Zoë Müller', 'Siân O’Tarn']],
  ] satisfies [EncodingLabel, string, string[]][])(
    'reads %s when a person chooses it',
    (label, text, names) => {
      expect(decodeText(bytes(text))).toMatchObject({ ok: true, sure: false });
      expect(
        rowsOf(decodeTextAs(bytes(text), label))
          .slice(1)
          .map(([name]) => name),
      ).toEqual(names);
    },
  );

  it('keeps 0 and 00 apart in every one of them', () => {
    const text = 'n,name\r\n0,a\r\n00,b\r\n';
    for (const encoded of [
      bytes(text),
      utf16(text, 'little', true),
      utf16(text, 'big', false),
      bytes(text.replaceAll('\r\n', '\r')),
    ]) {
      expect(rowsOf(decodeText(encoded)).map(([number]) => number)).toEqual(['n', '0', '00']);
    }
  });
});
