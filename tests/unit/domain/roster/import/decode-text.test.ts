import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decodeText, decodeTextAs, encodingChoices } from '@/lib/domain/roster/import/decode-text';

const utf8 = (text: string): Uint8Array => new TextEncoder().encode(text);

describe('decodeText', () => {
  it('gives back any text that was stored as UTF-8', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', minLength: 1 }), (text) => {
        fc.pre(text.trim() !== '' && !/[\u0000-\u001F]/.test(text) && !text.startsWith('\uFEFF'));
        fc.pre(!/^(?:PK|%PDF|GIF8)/.test(text));
        expect(decodeText(utf8(text))).toMatchObject({ ok: true, text, encoding: 'UTF-8', sure: true });
      }),
    );
  });

  it('refuses what is not text, and says what to bring instead', () => {
    const nul = Uint8Array.from([65, 0, 0, 66, 7, 200]);
    for (const bytes of [
      utf8('%PDF-1.7'),
      Uint8Array.from([0x50, 0x4b, 3, 4, 20]),
      nul,
      Uint8Array.from([1, 2, 3, 4, 5]),
    ]) {
      const result = decodeText(bytes);
      expect(result).toMatchObject({ ok: false, code: 'not-text' });
      expect(!result.ok && result.message).toContain('.xlsx');
    }
  });

  it('refuses an empty file, one of blanks only, and one over 5 MB', () => {
    expect(decodeText(new Uint8Array())).toMatchObject({ ok: false, code: 'empty' });
    expect(decodeText(utf8(' \r\n\t'))).toMatchObject({ ok: false, code: 'empty' });
    const large = decodeText(new Uint8Array(5 * 1024 * 1024 + 1).fill(65));
    expect(large).toMatchObject({ ok: false, code: 'too-large' });
    expect(decodeText(new Uint8Array(5 * 1024 * 1024).fill(65)).ok).toBe(true);
  });

  it('shows and counts what a marked file holds that is not in its encoding', () => {
    const result = decodeText(Uint8Array.from([0xff, 0xfe, 65, 0, 0x3d, 0xd8, 66, 0]));
    expect(result).toMatchObject({ ok: true, text: 'A\uFFFDB', encoding: 'UTF-16 LE' });
    expect(result.ok && result.note).toContain('1 place could not be read');
  });

  it('answers for any bytes, guessed or in any encoding a person may choose', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 200 }), (bytes) => {
        for (const result of [
          decodeText(bytes),
          ...encodingChoices.map(({ label }) => decodeTextAs(bytes, label)),
        ]) {
          if (result.ok) expect(result.text.trim()).not.toBe('');
          else expect(result.message).toMatch(/\.$/);
        }
      }),
      { numRuns: 500 },
    );
  });
});
