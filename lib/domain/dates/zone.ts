import { z } from 'zod';
import { isDay } from './day';

/**
 * An instant read from a clock on the wall. `note` is there when the wall clock is ambiguous: a `skipped hour` does not
 * exist on that day (clocks go forward), a `repeated hour` exists twice (clocks go back).
 */
export type ZonedReading = { instant: Date; note?: 'skipped hour' | 'repeated hour' };

const localPattern = /^(\d{4}-\d\d-\d\d)T([01]\d|2[0-3]):([0-5]\d)$/;

/** A day and a time as a datetime-local input writes them: YYYY-MM-DDTHH:mm. */
export const localDateTimeSchema = z
  .string()
  .refine((text) => isDay(localPattern.exec(text)?.[1] ?? ''), 'Choose a day and a time.');

/** Whether this machine's calendar data knows the time zone, such as "Europe/London". */
export function isTimeZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

/**
 * The instant at which clocks in the zone show `local` (YYYY-MM-DDTHH:mm). In a skipped hour it is as much later as the
 * clocks jump (02:30 becomes 03:30); of a repeated hour it is the first. Throws a RangeError when `local` is not a day
 * and time, which localDateTimeSchema has refused before.
 */
export function toInstant(local: string, timeZone: string): ZonedReading {
  if (!localDateTimeSchema.safeParse(local).success) throw new RangeError(`not a day and time: ${local}`);
  const asUtc = Date.parse(`${local}:00Z`);
  // No zone is a day away from UTC and none changes twice in two days, so these are the offsets that can apply.
  const before = findOffset(asUtc - dayMs, timeZone);
  const after = findOffset(asUtc + dayMs, timeZone);
  const fitting = [...new Set([before, after])]
    .filter((offset) => findOffset(asUtc - offset, timeZone) === offset)
    .map((offset) => asUtc - offset)
    .sort((a, b) => a - b);
  const [first, second] = fitting;
  if (first === undefined) return { instant: new Date(asUtc - before), note: 'skipped hour' };
  if (second === undefined) return { instant: new Date(first) };
  return { instant: new Date(first), note: 'repeated hour' };
}

/** What clocks in the zone show at the instant, cut to the minute: YYYY-MM-DDTHH:mm, as a datetime-local input wants it. */
export function toLocalInput(instant: Date, timeZone: string): string {
  const shown = new Date(instant.getTime() + findOffset(instant.getTime(), timeZone));
  return shown.toISOString().slice(0, 16);
}

/** The day on the wall calendar in the zone at the instant, YYYY-MM-DD. */
export const toDay = (instant: Date, timeZone: string): string =>
  toLocalInput(instant, timeZone).slice(0, 10);

const dayMs = 86_400_000;
const formats = new Map<string, Intl.DateTimeFormat>();

/** Milliseconds by which clocks in the zone are ahead of UTC at a time. */
function findOffset(time: number, timeZone: string): number {
  const format = formats.get(timeZone) ?? makeFormat(timeZone);
  const parts = Object.fromEntries(format.formatToParts(time).map((part) => [part.type, Number(part.value)]));
  const { year = 0, month = 1, day = 1, hour = 0, minute = 0, second = 0 } = parts;
  const shown = Date.UTC(year, month - 1, day, hour, minute, second);
  return shown - Math.floor(time / 1000) * 1000;
}

function makeFormat(timeZone: string): Intl.DateTimeFormat {
  const format = new Intl.DateTimeFormat('en-u-ca-gregory-nu-latn', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  });
  formats.set(timeZone, format);
  return format;
}
