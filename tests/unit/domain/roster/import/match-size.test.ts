import { describe, expect, it } from 'vitest';
import { findSize } from '@/lib/domain/roster/import/match-size';
import { garments } from '../../../../factories/garments';

const [shirt, shorts] = garments;

describe('findSize', () => {
  it.each([
    ['YM', 'YM'],
    ['ym', 'YM'],
    [' Y M ', 'YM'],
    ['Youth Medium', 'YM'],
    ['youth-medium', 'YM'],
    ['medium (youth)', 'YM'],
    ['Medium', 'M'],
    ['Adult M', 'M'],
    ['XXL', '2XL'],
    ['2 x large', '2XL'],
  ])('reads %j as %s', (typed, code) => {
    expect(shirt && findSize(shirt, typed)).toBe(code);
  });

  it.each(['', 'XL', '12', 'medium or large', 'tall', 'Y'])('leaves %j to a person', (typed) => {
    expect(shirt && findSize(shirt, typed)).toBeNull();
  });

  it('reads ages with any dash, and never takes one range for another', () => {
    expect(shorts && findSize(shorts, '9 – 10')).toBe('9-10');
    expect(shorts && findSize(shorts, '9/10')).toBe('9-10');
    expect(shorts && findSize(shorts, '9-11')).toBeNull();
  });
});
