import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NCAA, Basketball Rules, rule 1-22, 2023-24 onwards, from a copy of the body's announcement: 0 or 00 to 99.
 * Whether one roster may hold both 0 and 00 is not clear from it; the stricter reading is the program's.
 */
const preset = 'basketball-ncaa-2023';

describe('NCAA Basketball Rules from 2023-24, 1-22', () => {
  it('lets a player wear 0, 00 and 1 to 99, and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(['00', ...Array.from({ length: 100 }, (_, i) => String(i))]);
  });
  it('does not let one roster hold 0 and 00, by the stricter reading', () => {
    expect(judgeNumbers(preset, ['0', '00'])).toEqual(['zero-and-double-zero']);
  });
});
