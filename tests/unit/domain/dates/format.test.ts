import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatDay,
  formatInstant,
  formatShortDay,
  formatShortInstant,
  formatTime,
} from '@/lib/domain/dates/format';

describe('writing a date', () => {
  it('names the weekday, the day and the month', () => {
    expect(formatDay('2026-09-11')).toBe('Friday 11 September');
    expect(formatShortDay('2026-09-11')).toBe('Fri 11 Sep');
  });

  it('adds the year only when it is not the year of reference', () => {
    expect(formatDay('2027-01-08', 2026)).toBe('Friday 8 January 2027');
    expect(formatDay('2026-09-11', 2026)).toBe('Friday 11 September');
  });

  it('shows an instant on the clocks of the zone', () => {
    const instant = new Date('2026-09-11T22:00Z');
    expect(formatInstant(instant, 'America/New_York')).toBe('Friday 11 September at 18:00');
    expect(formatInstant(instant, 'Europe/London', 2025)).toBe('Friday 11 September 2026 at 23:00');
    expect(formatShortInstant(instant, 'Asia/Kathmandu')).toBe('Sat 12 Sep at 03:45');
    expect(formatTime(new Date('2026-09-11T00:00Z'), 'UTC')).toBe('00:00');
  });

  it('agrees with the calendar of Intl on every day', () => {
    const day = fc
      .integer({ min: Date.UTC(1900, 0, 1) / 86_400_000, max: Date.UTC(2199, 11, 31) / 86_400_000 })
      .map((days) => new Date(days * 86_400_000));
    const intl = new Intl.DateTimeFormat('en', {
      timeZone: 'UTC',
      weekday: 'long',
      day: 'numeric',
      month: 'long',
      year: 'numeric',
    });
    fc.assert(
      fc.property(day, (at) => {
        const {
          weekday,
          day: date,
          month,
          year,
        } = Object.fromEntries(intl.formatToParts(at).map((part) => [part.type, part.value]));
        expect(formatDay(at.toISOString().slice(0, 10), 1)).toBe(`${weekday} ${date} ${month} ${year}`);
      }),
    );
  });
});
