import { readDay } from './day';
import { toLocalInput } from './zone';

// Written by hand: what Intl writes for a language changes from one release of its data to the next.
const weekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'];
const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/**
 * A day (YYYY-MM-DD) in full: "Friday 11 September". With a reference year the year follows when it is another one:
 * "Friday 8 January 2027".
 */
export function formatDay(day: string, referenceYear?: number): string {
  const { weekday, date, month, year } = readParts(day);
  return `${weekday} ${date} ${month}${yearWhenOther(year, referenceYear)}`;
}

/** A day (YYYY-MM-DD) where room is short: "Fri 11 Sep". */
export function formatShortDay(day: string): string {
  const { weekday, date, month } = readParts(day);
  return `${weekday.slice(0, 3)} ${date} ${month.slice(0, 3)}`;
}

/** The time clocks in the zone show at the instant: "18:00". */
export const formatTime = (instant: Date, timeZone: string): string =>
  toLocalInput(instant, timeZone).slice(11);

/**
 * An instant on the clocks of the zone: "Friday 11 September at 18:00". With a reference year the year is added when it
 * is another one.
 */
export function formatInstant(instant: Date, timeZone: string, referenceYear?: number): string {
  const local = toLocalInput(instant, timeZone);
  return `${formatDay(local.slice(0, 10), referenceYear)} at ${local.slice(11)}`;
}

/** An instant where room is short: "Fri 11 Sep at 18:00". */
export function formatShortInstant(instant: Date, timeZone: string): string {
  const local = toLocalInput(instant, timeZone);
  return `${formatShortDay(local.slice(0, 10))} at ${local.slice(11)}`;
}

const yearWhenOther = (year: number, reference: number | undefined): string =>
  reference === undefined || reference === year ? '' : ` ${year}`;

function readParts(day: string): { weekday: string; date: number; month: string; year: number } {
  const at = new Date(readDay(day));
  return {
    weekday: weekdays[at.getUTCDay()] ?? '',
    date: at.getUTCDate(),
    month: months[at.getUTCMonth()] ?? '',
    year: at.getUTCFullYear(),
  };
}
