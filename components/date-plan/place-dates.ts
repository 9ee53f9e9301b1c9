import { daysBetween } from '@/lib/domain/dates/day';

/**
 * Places days on a line from 0 to 100, true to scale, then pushes neighbours apart until their labels have room
 * (`room`, in hundredths of the line). Days are YYYY-MM-DD in rising order; the first stands at 0 and the last at 100.
 * With more days than the line has room for they stand evenly. Empty when there are no days.
 */
export function placeDates(days: readonly string[], room: number): number[] {
  const [first, last] = [days[0], days.at(-1)];
  if (first === undefined || last === undefined) return [];
  const steps = days.length - 1;
  const length = daysBetween(first, last);
  if (steps === 0) return [0];
  if (length === 0 || steps * room >= 100) return days.map((_, at) => (at * 100) / steps);
  const places = days.map((day) => (daysBetween(first, day) * 100) / length);
  for (let at = 1; at <= steps; at += 1) places[at] = Math.max(places[at] ?? 0, (places[at - 1] ?? 0) + room);
  places[steps] = 100;
  for (let at = steps - 1; at > 0; at -= 1)
    places[at] = Math.min(places[at] ?? 0, (places[at + 1] ?? 0) - room);
  return places;
}

/** Where today stands among placed days: between its neighbours in proportion, 0 before the first, 100 after the last. */
export function placeToday(days: readonly string[], places: readonly number[], today: string): number {
  const next = days.findIndex((day) => day > today);
  if (next === -1) return 100;
  const [from, to] = [days[next - 1], days[next]];
  const [left, right] = [places[next - 1], places[next]];
  if (from === undefined || to === undefined || left === undefined || right === undefined) return 0;
  return left + ((right - left) * daysBetween(from, today)) / daysBetween(from, to);
}
