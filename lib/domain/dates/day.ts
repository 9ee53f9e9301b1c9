import { z } from 'zod';

const dayMs = 86_400_000;

/** Whether the text is a day that is on the calendar, written YYYY-MM-DD, in the years 1900 to 2199. */
export function isDay(text: string): boolean {
  if (!/^(19|20|21)\d\d-\d\d-\d\d$/.test(text)) return false;
  const time = Date.parse(`${text}T00:00:00Z`);
  return !Number.isNaN(time) && new Date(time).toISOString().slice(0, 10) === text;
}

/** A day of the calendar, YYYY-MM-DD. */
export const daySchema = z.string().refine(isDay, 'Choose a day of the calendar.');

/** Days from the first day to the second, both YYYY-MM-DD: 0 for the same day, negative when the second is earlier. */
export function daysBetween(from: string, to: string): number {
  return Math.round((readDay(to) - readDay(from)) / dayMs);
}

/** The day so many days later, or earlier for a negative count, YYYY-MM-DD. */
export function addDays(day: string, days: number): string {
  return new Date(readDay(day) + days * dayMs).toISOString().slice(0, 10);
}

/** Milliseconds of a day's midnight in UTC; throws a RangeError for what is no day. */
export function readDay(day: string): number {
  if (!isDay(day)) throw new RangeError(`not a day: ${day}`);
  return Date.parse(`${day}T00:00:00Z`);
}
