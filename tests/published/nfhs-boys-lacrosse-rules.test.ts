import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NFHS, Boys Lacrosse Rules Book, rule 1-9-1g, from a copy of 2022 to 2024: 0 to 99 are legal, 00 and 01 to 09
 * are not, and no number is worn twice.
 */
const preset = 'lacrosse-nfhs-boys';

describe('NFHS Boys Lacrosse Rules Book, 1-9-1g', () => {
  it('lets a player wear 0 to 99 and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(Array.from({ length: 100 }, (_, i) => String(i)));
  });
  it.each([
    ['00', 'number-not-allowed'],
    ['01', 'leading-zero'],
    ['09', 'leading-zero'],
  ])('refuses %s: %s', (number, code) => {
    expect(judgeNumbers(preset, [number])).toEqual([code]);
  });
});
