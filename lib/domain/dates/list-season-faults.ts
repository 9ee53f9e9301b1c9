import { addDays, daysBetween, isDay } from './day';

/** The days a season hangs on, YYYY-MM-DD on the league's calendar; `freezeOn` is the day of the freeze. */
export type SeasonDays = {
  rosterOpensOn: string;
  freezeOn: string;
  handOutOn: string;
  firstMatchOn: string;
};

/**
 * What is wrong with the order of a season's days: a sentence by field; empty when they follow each other. What is no
 * day is compared with nothing: it is somebody else's to say.
 */
export function listSeasonFaults(days: SeasonDays): Partial<Record<keyof SeasonDays, string>> {
  const faults: Partial<Record<keyof SeasonDays, string>> = {};
  const gap = (from: string, to: string) => (isDay(from) && isDay(to) ? daysBetween(from, to) : Infinity);
  if (gap(days.rosterOpensOn, days.freezeOn) < 1)
    faults.freezeOn = 'Rosters freeze at least a day after they open.';
  if (gap(days.freezeOn, days.handOutOn) < 1)
    faults.handOutOn = 'Hand-out is at least a day after the freeze; a decorator needs some weeks between.';
  if (gap(days.handOutOn, days.firstMatchOn) < 0)
    faults.firstMatchOn = 'The first match cannot be before the kit is handed out.';
  return faults;
}

/**
 * Days to start planning a season from: rosters open today and freeze in three weeks, and the decorator has five until
 * hand-out, a week before the first match. Our own figures, common practice, no source.
 */
export function suggestSeasonDays(today: string): SeasonDays {
  return {
    rosterOpensOn: today,
    freezeOn: addDays(today, 21),
    handOutOn: addDays(today, 56),
    firstMatchOn: addDays(today, 63),
  };
}
