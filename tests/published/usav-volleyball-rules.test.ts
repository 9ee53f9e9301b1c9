import { describe, expect, it } from 'vitest';
import { judgeNumbers, listLegalAlone } from '../support/judge-numbers';

/**
 * Source: USA Volleyball, Domestic Competition Regulations 2023-25, 4.3.3, as quoted by its regions: numbers from 1 to
 * 99, none twice in a team.
 */
const preset = 'volleyball-usav-2023';

describe('USA Volleyball Domestic Competition Regulations 2023-25, 4.3.3', () => {
  it('lets a player wear 1 to 99 and nothing else', () => {
    expect(listLegalAlone(preset)).toEqual(Array.from({ length: 99 }, (_, i) => String(i + 1)));
  });
  it('does not let two players of a team wear the same number', () => {
    expect(judgeNumbers(preset, ['12', '12'])).toEqual(['number-repeated']);
  });
});
