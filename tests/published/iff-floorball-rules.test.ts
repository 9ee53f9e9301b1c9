import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: IFF, Rules of the Game, 2022, rule 401, from a copy of the text: whole numbers from 1 to 99, no two of a team
 * the same; 1 is not for field players.
 */
const preset = 'floorball-iff-2022';

describe('IFF Rules of the Game 2022, 401', () => {
  it('lets a goalkeeper wear 1 to 99 and a field player 2 to 99', () => {
    expect(listLegalAlone(preset, 'goalkeeper')).toHaveLength(99);
    expect(listLegalAlone(preset, 'field player')).toEqual(
      Array.from({ length: 98 }, (_, i) => String(i + 2)),
    );
  });
  it('does not let two players of a team wear the same number', () => {
    expect(judgeNumbers(preset, ['8', '8'])).toEqual(['number-repeated']);
  });
});
