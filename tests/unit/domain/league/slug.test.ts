import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { makeSlug, makeUniqueSlug } from '@/lib/domain/league/slug';

describe('a slug', () => {
  it('is lower-case letters, digits and single hyphens whatever the name', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 90 }), (name) => {
        expect(makeSlug(name, 'team')).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
      }),
    );
  });

  it('drops accents, keeps words apart, and falls back when no Latin letter is left', () => {
    expect(makeSlug('Šarić & Peña United', 'team')).toBe('saric-pena-united');
    expect(makeSlug('الصقور', 'team')).toBe('team');
  });

  it('never hides a page of the product', () => {
    for (const name of ['API', 'check', 'Sign in', 'number rules', 'match'])
      expect(makeSlug(name, 'x')).toMatch(/-1$/);
  });

  it('is unlike every slug that is taken', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom('Otters', 'OTTERS', 'Herons', '')), (names) => {
        const taken = new Set<string>();
        for (const name of names) taken.add(makeUniqueSlug(name, 'team', taken));
        expect(taken.size).toBe(names.length);
      }),
    );
  });
});
