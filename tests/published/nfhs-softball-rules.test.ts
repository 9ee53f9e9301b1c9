import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NFHS, Softball Rules Book, rule 3-2-2, 2016 to 2019, read on the body's page: no two players wear the same
 * number, and 0 and 00 count as the same.
 */
const preset = 'softball-nfhs';

describe('NFHS Softball Rules Book, 3-2-2', () => {
  it.each(['0', '00', '7'])('lets a player wear %s', (number) => {
    expect(judgeNumbers(preset, [number])).toEqual([]);
  });
  it('lets a player wear 00 and 0 to 99: the end at 99 is from memory, not from the page', () => {
    expect(listLegalAlone(preset)).toEqual(['00', ...Array.from({ length: 100 }, (_, i) => String(i))]);
  });
  it('counts 0 and 00 as the same number', () => {
    expect(judgeNumbers(preset, ['0', '00'])).toEqual(['number-repeated']);
  });
});
