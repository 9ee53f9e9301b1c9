import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: IHF, Rules of the Game, 1 July 2016, rules 4:7 to 4:9, from a copy of the text: players wear numbers from 1 to
 * 99, and no two players of a team the same.
 */
const preset = 'handball-ihf-2016';

describe('IHF Rules of the Game 2016, 4:8', () => {
  it('lets a player wear 1 to 99 and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(Array.from({ length: 99 }, (_, i) => String(i + 1)));
  });
  it('does not let two players of a team wear the same number', () => {
    expect(judgeNumbers(preset, ['1', '16', '1'])).toEqual(['number-repeated']);
  });
});
