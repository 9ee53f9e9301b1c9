import { expect, it } from 'vitest';
import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';

it('a name is found without its accents, in lower case', () => {
  expect(foldForSearch('José Müller')).toBe('jose muller');
  expect(foldForSearch('Łukasz Ødegård Đặng Weiß')).toBe('lukasz odegard dang weiss');
});

it('every word typed must be there, in any order, and nothing typed finds all', () => {
  const row = foldForSearch('Otters U12 Mixed');
  expect(holdsEveryWord(row, 'mixed ott')).toBe(true);
  expect(holdsEveryWord(row, 'otters u14')).toBe(false);
  expect(holdsEveryWord(row, '  ')).toBe(true);
});
