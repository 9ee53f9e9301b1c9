import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { splitPersonName } from '@/lib/domain/text/person-name';
import { anyText } from '../../../support/arbitrary-rosters';

describe('splitPersonName', () => {
  it.each([
    ['Dunmore, Pip', 'Pip', 'Dunmore'],
    ['Pip Dunmore', 'Pip', 'Dunmore'],
    ['Pip  Q. Dunmore', 'Pip Q.', 'Dunmore'],
    ['Pip van der Dunmore', 'Pip', 'van der Dunmore'],
    ['van Dunmore', 'van', 'Dunmore'],
    ['Pip Dunmore Jr.', 'Pip', 'Dunmore'],
    ['Pip Dunmore, III', 'Pip', 'Dunmore'],
    ['Dunmore Jr, Pip', 'Pip', 'Dunmore'],
    ['Dunmore,', '', 'Dunmore'],
    [', Pip', '', 'Pip'],
    ['Dunmore', '', 'Dunmore'],
    ['سهيل الوادي', 'سهيل', 'الوادي'],
    ['الوادي، سهيل', 'سهيل', 'الوادي'],
    ['X', '', 'X'],
    ['', '', ''],
  ])('takes %j apart', (name, given, surname) => {
    expect(splitPersonName(name)).toEqual({ given, surname });
  });

  it('never throws', () => {
    fc.assert(fc.property(anyText, (name) => void splitPersonName(name)));
  });
});
