import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { listBatchTexts } from '@/lib/documents/text/list-batch-texts';
import { makeTypeCase, type TypeCase } from '@/lib/documents/text/type-case';
import { hostileNames, makeHostileBatch } from '@/tests/factories/snapshots';

let type: TypeCase;
beforeAll(async () => {
  type = await makeTypeCase(listBatchTexts(makeHostileBatch()));
});

describe('the type case of a batch', () => {
  it('draws every letter of its texts but those no font has, also behind and before other words', () => {
    const undrawn = /[\p{Script=Georgian}\p{Extended_Pictographic}]/u;
    for (const name of hostileNames.filter((text) => !undrawn.test(text))) {
      for (const text of [name, `${name}, home (navy); 12`, `Worn by ${name}.`]) {
        for (const style of ['text', 'strong', 'figure', 'code'] as const) {
          expect(type.shape(style, text).missing, `${style} ${text}`).toEqual([]);
        }
      }
    }
    expect(type.shape('text', 'Pip 🏀 Star').missing).toEqual(['🏀']);
    expect(type.shape('text', 'ქართ').missing).toEqual(['ქ', 'ა', 'რ', 'თ']);
  });

  it('measures a line as the sum of the advances it is drawn with, kerning included', () => {
    const line = type.shape('text', 'AVATo');
    const last = line.glyphs.at(-1);
    expect((last?.x ?? 0) + (last?.advance ?? 0)).toBeCloseTo(line.width, 10);
    const alone = [...'AVATo'].reduce((sum, letter) => sum + type.shape('text', letter).width, 0);
    expect(line.width).toBeLessThan(alone - 0.1);
  });

  it('joins Arabic letters: a word has other glyphs than its letters alone', () => {
    const glyphs = (text: string) => type.shape('text', text).glyphs.map((glyph) => glyph.id);
    const word = new Set(glyphs('سهيل'));
    expect([...'سهيل'].flatMap(glyphs).filter((id) => word.has(id)).length).toBeLessThan(3);
  });

  it('keeps the zero-width non-joiner that Persian names are spelt with', () => {
    const ids = (text: string) =>
      type
        .shape('text', text)
        .glyphs.map((glyph) => glyph.id)
        .join();
    expect(ids('علی‌رضا')).not.toBe(ids('علیرضا'));
    expect(type.shape('text', 'علی‌رضا').missing).toEqual([]);
  });

  it('has the same bytes whatever the order of its texts', async () => {
    const texts = listBatchTexts(makeHostileBatch());
    const turned = await makeTypeCase([...texts, ...texts].reverse());
    for (const [name, face] of type.faces)
      expect(turned.faces.get(name)?.file.equals(face.file), name).toBe(true);
    expect(turned.faces.size).toBe(type.faces.size);
  });

  it('embeds only faces that are needed', async () => {
    const plain = await makeTypeCase(['Otters']);
    expect([...plain.faces.keys()]).toEqual(['archivo-400', 'archivo-600', 'saira-800', 'spline-500']);
    for (const face of plain.faces.values()) expect(face.file.length).toBeLessThan(40_000);
  });

  it('shapes any text without a fault, drawing a box for what it was not made for', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 30 }), (text) => {
        const line = type.shape('code', text);
        expect(Number.isFinite(line.width)).toBe(true);
        expect(line.glyphs.filter((glyph) => glyph.face === null).length).toBe(line.missing.length);
      }),
      { numRuns: 500 },
    );
  });
});
