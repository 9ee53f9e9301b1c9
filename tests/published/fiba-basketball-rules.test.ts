import { describe, expect, it } from 'vitest';
import { countLabels, judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: FIBA, Official Basketball Rules, in force from 1 October 2014, Art. 4.3.2, as quoted by others (the book itself
 * was not read): players wear 0, 00 and 1 to 99, no two of a team the same; 0 and 00 are two numbers, 101 in all.
 */
const preset = 'basketball-fiba-2014';

describe('FIBA Official Basketball Rules, from 1 October 2014, Art. 4.3.2', () => {
  it('has 101 numbers', () => {
    expect(countLabels(preset)).toBe(101);
  });
  it('lets a player wear 0, 00 and 1 to 99, and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(['00', ...Array.from({ length: 100 }, (_, i) => String(i))]);
  });
  it.each(['100', '000', '-1', '4.5'])('does not let a player wear %s', (number) => {
    expect(judgeNumbers(preset, [number])).toHaveLength(1);
  });
  it('lets one team wear both 0 and 00', () => {
    expect(judgeNumbers(preset, ['0', '00'])).toEqual([]);
  });
  it('does not let two players of a team wear the same number', () => {
    expect(judgeNumbers(preset, ['00', '00'])).toEqual(['number-repeated']);
  });
});
