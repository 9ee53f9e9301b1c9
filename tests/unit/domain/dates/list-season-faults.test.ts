import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays } from '@/lib/domain/dates/day';
import { listSeasonFaults, suggestSeasonDays } from '@/lib/domain/dates/list-season-faults';

const good = {
  rosterOpensOn: '2027-03-01',
  freezeOn: '2027-03-02',
  handOutOn: '2027-03-03',
  firstMatchOn: '2027-03-03',
};

describe("the order of a season's days", () => {
  it('may be as tight as a day between opening, freeze and hand-out, with the first match on hand-out day', () => {
    expect(listSeasonFaults(good)).toEqual({});
  });

  it.each([
    ['freezeOn', { freezeOn: '2027-03-01' }],
    ['handOutOn', { handOutOn: '2027-03-02' }],
    ['firstMatchOn', { firstMatchOn: '2027-03-02' }],
  ])('is wrong at %s when that day comes too early', (field, change) => {
    expect(Object.keys(listSeasonFaults({ ...good, ...change }))).toEqual([field]);
  });

  it('is not judged by what is no day', () => {
    expect(listSeasonFaults({ ...good, freezeOn: '2027-02-30', firstMatchOn: '' })).toEqual({});
  });

  it('is right in every suggestion', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 90_000 }), (days) => {
        expect(listSeasonFaults(suggestSeasonDays(addDays('1900-01-01', days)))).toEqual({});
      }),
    );
  });
});
