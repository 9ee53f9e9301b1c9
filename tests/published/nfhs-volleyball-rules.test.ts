import { expect, it } from 'vitest';
import { listLegalAlone } from '../support/judge-numbers';

/**
 * Source: NFHS, Volleyball Rules Book, rule 4-2-4 as changed from 2028-29, as quoted by others: no leading zero and no
 * 00; a plain 0 stays legal; at most two digits.
 */
it('NFHS Volleyball Rules Book from 2028-29, 4-2-4, lets a player wear 0 to 99 without a leading zero', () => {
  expect(listLegalAlone('volleyball-nfhs-2028')).toEqual(Array.from({ length: 100 }, (_, i) => String(i)));
});
