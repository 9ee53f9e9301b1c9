import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: WFDF, Rules of Ultimate, Appendix, C4, 2021 to 2024, from a copy of the text: a whole number from 0 to 99,
 * another for each player of a team; a number of one digit may be worn with a leading zero.
 */
const preset = 'ultimate-wfdf-2021';

describe('WFDF Rules of Ultimate 2021, Appendix C4', () => {
  it('lets a player wear 0 to 99, one digit also with a leading zero', () => {
    const zeros = Array.from({ length: 10 }, (_, digit) => `0${digit}`);
    expect(listLegalAlone(preset)).toEqual([...zeros, ...Array.from({ length: 100 }, (_, i) => String(i))]);
  });
  it('counts 1 and 01 as the same number', () => {
    expect(judgeNumbers(preset, ['1', '01'])).toEqual(['number-repeated']);
  });
});
