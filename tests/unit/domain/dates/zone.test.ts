import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, daysBetween, isDay } from '@/lib/domain/dates/day';
import { isTimeZone, localDateTimeSchema, toDay, toInstant, toLocalInput } from '@/lib/domain/dates/zone';

const zones = [
  'UTC',
  'Europe/London',
  'America/New_York',
  'America/St_Johns',
  'Australia/Lord_Howe',
  'Asia/Kathmandu',
  'Pacific/Apia',
  'Pacific/Chatham',
  'Africa/Casablanca',
];
const zone = fc.constantFrom(...zones);
const minute = fc
  .integer({ min: Date.UTC(1975, 0, 2) / 60_000, max: Date.UTC(2060, 0, 1) / 60_000 })
  .map((minutes) => new Date(minutes * 60_000));
const day = fc
  .integer({ min: Date.UTC(1900, 0, 1) / 86_400_000, max: Date.UTC(2199, 11, 31) / 86_400_000 })
  .map((days) => new Date(days * 86_400_000).toISOString().slice(0, 10));

describe('reading a wall clock', () => {
  it('gives back the instant whose wall time it is, or the first of the two of a repeated hour', () => {
    fc.assert(
      fc.property(minute, zone, (instant, timeZone) => {
        const local = toLocalInput(instant, timeZone);
        const reading = toInstant(local, timeZone);
        expect(toLocalInput(reading.instant, timeZone)).toBe(local);
        expect(reading.note).not.toBe('skipped hour');
        if (reading.note === undefined) expect(reading.instant).toEqual(instant);
        else expect(reading.instant.getTime()).toBeLessThanOrEqual(instant.getTime());
      }),
      { numRuns: 2000 },
    );
  });

  it('never goes back in time when the wall clock goes forward, but in a repeated hour', () => {
    fc.assert(
      fc.property(minute, zone, fc.integer({ min: 1, max: 3000 }), (instant, timeZone, later) => {
        const from = toInstant(toLocalInput(instant, timeZone), timeZone);
        const to = toInstant(toLocalInput(new Date(instant.getTime() + later * 60_000), timeZone), timeZone);
        if (from.note === undefined && to.note === undefined) {
          expect(to.instant.getTime()).toBeGreaterThan(from.instant.getTime());
        }
      }),
    );
  });

  it('moves a time of the skipped hour on by as much as the clocks jump', () => {
    const reading = toInstant('2026-03-29T01:30', 'Europe/London');
    expect(reading).toEqual({ instant: new Date('2026-03-29T01:30Z'), note: 'skipped hour' });
    expect(toLocalInput(reading.instant, 'Europe/London')).toBe('2026-03-29T02:30');
  });

  it('takes the first of the two when the hour comes twice', () => {
    expect(toInstant('2026-11-01T01:30', 'America/New_York')).toEqual({
      instant: new Date('2026-11-01T05:30Z'),
      note: 'repeated hour',
    });
  });

  it('knows a change of half an hour and a day that one island left out', () => {
    expect(toInstant('2026-10-04T02:15', 'Australia/Lord_Howe').note).toBe('skipped hour');
    expect(toInstant('2011-12-30T12:00', 'Pacific/Apia').note).toBe('skipped hour');
  });

  it('says which day it is where the league plays', () => {
    expect(toDay(new Date('2026-09-11T03:00Z'), 'America/New_York')).toBe('2026-09-10');
    expect(toDay(new Date('2026-09-11T13:00Z'), 'Pacific/Chatham')).toBe('2026-09-12');
  });

  it('refuses what is no day and time', () => {
    for (const text of ['', '2026-02-30T10:00', '2026-02-03T24:00', '2026-02-03 10:00', '2026-2-3T10:00']) {
      expect(localDateTimeSchema.safeParse(text).success).toBe(false);
      expect(() => toInstant(text, 'UTC')).toThrow(RangeError);
    }
  });

  it('knows a time zone from a word that is none', () => {
    expect(isTimeZone('Europe/Dublin')).toBe(true);
    expect(isTimeZone('Europe/Nowhere')).toBe(false);
  });
});

describe('counting days', () => {
  it('adds the days between two days back to the later one', () => {
    fc.assert(
      fc.property(day, day, (from, to) => {
        expect(addDays(from, daysBetween(from, to))).toBe(to);
        expect(daysBetween(to, from) + daysBetween(from, to)).toBe(0);
      }),
    );
  });

  it('counts over a change of clocks and a leap day', () => {
    expect(daysBetween('2026-03-28', '2026-03-30')).toBe(2);
    expect(daysBetween('2028-02-28', '2028-03-01')).toBe(2);
  });

  it('takes only days of the calendar', () => {
    expect(['2027-02-29', '2027-13-01', '27-01-01', '', '2500-01-01'].filter(isDay)).toEqual([]);
  });
});
