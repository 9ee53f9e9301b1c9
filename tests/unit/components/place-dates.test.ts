import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeDates, placeToday } from '@/components/date-plan/place-dates';
import { addDays } from '@/lib/domain/dates/day';

describe('the places of a date plan', () => {
  it('are true to scale where there is room', () => {
    expect(placeDates(['2027-08-01', '2027-08-26', '2027-11-09'], 10)).toEqual([0, 25, 100]);
  });

  it('keep two days next to each other readable, at either end', () => {
    expect(placeDates(['2027-08-01', '2027-08-02', '2027-11-09'], 10)).toEqual([0, 10, 100]);
    expect(placeDates(['2027-08-01', '2027-11-08', '2027-11-09'], 10)).toEqual([0, 90, 100]);
  });

  it('never overlap, never leave the line and never change order', () => {
    const gaps = fc.array(fc.integer({ min: 0, max: 60 }), { maxLength: 14 });
    fc.assert(
      fc.property(gaps, fc.integer({ min: 1, max: 20 }), (list, room) => {
        const days = list.reduce((all, gap) => [...all, addDays(all.at(-1) ?? '', gap)], ['2027-08-01']);
        const places = placeDates(days, room);
        const least = Math.min(room, 100 / Math.max(1, days.length - 1));
        places.forEach((place, at) => {
          expect(place).toBeGreaterThanOrEqual(0);
          expect(place).toBeLessThanOrEqual(100);
          if (at > 0) expect(place - (places[at - 1] ?? 0)).toBeGreaterThanOrEqual(least - 1e-9);
        });
      }),
    );
  });

  it('put today in proportion between its neighbours, and at the ends outside the plan', () => {
    const days = ['2027-08-01', '2027-08-11', '2027-08-31'];
    const places = [0, 50, 100];
    expect(placeToday(days, places, '2027-08-06')).toBe(25);
    expect(placeToday(days, places, '2027-08-11')).toBe(50);
    expect(placeToday(days, places, '2027-07-01')).toBe(0);
    expect(placeToday(days, places, '2027-12-01')).toBe(100);
  });
});
