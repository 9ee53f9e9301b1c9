import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NFHS, Basketball Rules Book, rule 3-4-3, number list as quoted by others in 2019 (the book itself was not
 * read). Legal: 0, 00, 1–5, 10–15, 20–25, 30–35, 40–45, 50–55; 0 and 00 not on one roster; no number twice. Officials
 * show the digits on the fingers of two hands, so 6 to 9 are out.
 */
const preset = 'basketball-nfhs';
const printed =
  '00 0 1 2 3 4 5 10 11 12 13 14 15 20 21 22 23 24 25 30 31 32 33 34 35 40 41 42 43 44 45 50 51 52 53 54 55';

describe('NFHS Basketball Rules Book, 3-4-3', () => {
  it('lets a player wear the printed numbers and no other', () => {
    expect(listLegalAlone(preset).join(' ')).toBe(printed);
  });
  it('does not let one roster hold 0 and 00', () => {
    expect(judgeNumbers(preset, ['0', '00'])).toEqual(['zero-and-double-zero']);
  });
  it('says of a number with a digit above 5 that the digit is why', () => {
    expect(judgeNumbers(preset, ['26', '42', '9'])).toEqual(['digit-not-allowed']);
  });
  it('does not let two players wear the same number', () => {
    expect(judgeNumbers(preset, ['12', '12'])).toEqual(['number-repeated']);
  });
});
