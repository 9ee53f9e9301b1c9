import { countOf } from '../text/count-of';
import { daysBetween } from './day';
import { formatShortDay } from './format';
import { toDay } from './zone';

type SeasonDates = {
  rosterOpensOn: string;
  freezesAt: Date;
  releaseOn: string | null;
  handOutOn: string;
  firstMatchOn: string;
};
type PlanDate = {
  id: string;
  label: string;
  day: string;
  dayLabel: string;
  note?: { tone: 'care' | 'set'; text: string };
};

/**
 * The dates of a season in rising order as a date plan draws them, each on its calendar day in the league's time zone.
 * The freeze says how many days are left while it is at most a fortnight away, in calendar days.
 */
export function listPlanDates(season: SeasonDates, timeZone: string, today: string): PlanDate[] {
  const freeze = toDay(season.freezesAt, timeZone);
  const left = daysBetween(today, freeze);
  const dates = [
    { id: 'opens', label: 'Roster opens', day: season.rosterOpensOn },
    { id: 'freeze', label: 'Freeze', day: freeze },
    { id: 'release', label: 'Release', day: season.releaseOn },
    { id: 'hand-out', label: 'Hand-out', day: season.handOutOn },
    { id: 'first-match', label: 'First match', day: season.firstMatchOn },
  ];
  return dates
    .flatMap(({ day, ...date }) => (day === null ? [] : [{ ...date, day, dayLabel: formatShortDay(day) }]))
    .sort((a, b) => (a.day < b.day ? -1 : a.day > b.day ? 1 : 0))
    .map((date) =>
      date.id === 'freeze' && left >= 0 && left <= 14
        ? {
            ...date,
            note: { tone: 'care' as const, text: left === 0 ? 'today' : `${countOf(left, 'day')} left` },
          }
        : date,
    );
}
