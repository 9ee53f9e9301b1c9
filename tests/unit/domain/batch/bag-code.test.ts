import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assignBagCodes, bagCodeAlphabet, isBagCode, makeBagCode } from '@/lib/domain/batch/bag-code';
import { hashOf } from '@/tests/factories/snapshots';

const seeds = fc.uint8Array({ minLength: 8, maxLength: 32 });
const codes = seeds.map(makeBagCode);
const swap = (text: string, at: number): string =>
  text.slice(0, at) + text.charAt(at + 1) + text.charAt(at) + text.slice(at + 2);

describe('bag code', () => {
  it('is eight characters in two fours, from an alphabet without look-alikes and vowels', () => {
    for (const character of '0O1ILU' + 'AE' + 'SZBGV') expect(bagCodeAlphabet).not.toContain(character);
    fc.assert(
      fc.property(codes, (code) =>
        new RegExp(`^[${bagCodeAlphabet}]{4}-[${bagCodeAlphabet}]{4}$`).test(code),
      ),
    );
  });

  it('is accepted as it was made, and only in capitals with its hyphen', () => {
    fc.assert(fc.property(codes, (code) => isBagCode(code)));
    const code = makeBagCode(hashOf('one'));
    for (const text of [code.toLowerCase(), code.replace('-', ''), ` ${code}`, `${code}\n`, '', 'YC7D-4M4']) {
      expect(isBagCode(text), JSON.stringify(text)).toBe(false);
    }
  });

  it('finds every single wrong character, at every place', () => {
    fc.assert(
      fc.property(codes, (code) => {
        for (const at of [0, 1, 2, 3, 5, 6, 7, 8]) {
          for (const other of bagCodeAlphabet) {
            if (other === code.charAt(at)) continue;
            expect(isBagCode(code.slice(0, at) + other + code.slice(at + 1))).toBe(false);
          }
        }
      }),
      { numRuns: 200 },
    );
  });

  it('finds every swap of neighbours, also across the hyphen', () => {
    fc.assert(
      fc.property(codes, (code) => {
        const plain = code.replace('-', '');
        for (let at = 0; at < 7; at += 1) {
          if (plain.charAt(at) === plain.charAt(at + 1)) continue;
          const swapped = swap(plain, at);
          expect(isBagCode(`${swapped.slice(0, 4)}-${swapped.slice(4)}`)).toBe(false);
        }
      }),
      { numRuns: 2000 },
    );
  });

  it('comes from the first eight bytes alone, and refuses fewer', () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        expect(makeBagCode(seed)).toBe(makeBagCode(seed.slice(0, 8)));
      }),
    );
    expect(() => makeBagCode(new Uint8Array(7))).toThrow(RangeError);
  });
});

describe('bag codes of a batch', () => {
  it('are all different, one for each id, whatever the order of the ids', () => {
    const ids = Array.from({ length: 3000 }, (_, at) => `player-${at}`);
    const given = assignBagCodes(ids, hashOf);
    expect(given.size).toBe(3000);
    expect(new Set(given.values()).size).toBe(3000);
    const turned = assignBagCodes([...ids].reverse(), hashOf);
    expect(ids.every((id) => turned.get(id) === given.get(id))).toBe(true);
  });

  it('stay apart and stay the same when hashes clash', () => {
    // A hash of two values only: nearly every id clashes and must be resolved.
    const poor = (text: string): Uint8Array => {
      const turn = Number(text.split('#')[1] ?? 0);
      return new Uint8Array([0, 0, 0, 0, 0, 0, turn, text.startsWith('a') ? 1 : 0]);
    };
    const ids = ['a1', 'a2', 'a3', 'b1', 'b2'];
    const given = assignBagCodes(ids, poor);
    expect(new Set(given.values()).size).toBe(5);
    expect([...given.values()].every(isBagCode)).toBe(true);
    expect(assignBagCodes([...ids].reverse(), poor)).toEqual(given);
  });

  it('are refused rather than doubled when the hash is broken', () => {
    expect(() => assignBagCodes(['a', 'b'], () => new Uint8Array(8))).toThrow(/same bag code/);
  });
});
