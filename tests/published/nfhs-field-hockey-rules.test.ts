import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NFHS, Field Hockey Rules Book, uniform rule, from a state association's copy of the 2010s: 00 and 0 to 99, no
 * three digits, 0 and 00 not both.
 */
const preset = 'field-hockey-nfhs';

describe('NFHS Field Hockey Rules Book, uniform rule', () => {
  it('lets a player wear 00 and 0 to 99 and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(['00', ...Array.from({ length: 100 }, (_, i) => String(i))]);
  });
  it('does not let one roster hold 0 and 00', () => {
    expect(judgeNumbers(preset, ['0', '00'])).toEqual(['zero-and-double-zero']);
  });
});
