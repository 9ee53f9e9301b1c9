import { describe, expect, it } from 'vitest';
import { listPlanDates } from '@/lib/domain/dates/plan-dates';

const season = {
  rosterOpensOn: '2027-02-15',
  // Just after midnight in Dublin, so the day depends on the zone.
  freezesAt: new Date('2027-07-11T23:30:00Z'),
  releaseOn: null,
  handOutOn: '2027-08-20',
  firstMatchOn: '2027-08-27',
};
const freezeOn = (today: string, zone = 'Europe/Dublin') =>
  listPlanDates(season, zone, today).find((date) => date.id === 'freeze');

describe('the dates of a season on a plan', () => {
  it('stand in rising order, without a release that is not planned', () => {
    const dates = listPlanDates({ ...season, firstMatchOn: '2027-03-01' }, 'UTC', '2027-01-01');
    expect(dates.map((date) => date.id)).toEqual(['opens', 'first-match', 'freeze', 'hand-out']);
    expect(
      listPlanDates({ ...season, releaseOn: '2027-07-15' }, 'UTC', '2027-01-01').map((date) => date.id),
    ).toEqual(['opens', 'freeze', 'release', 'hand-out', 'first-match']);
  });

  it('put the freeze on its day where the league plays', () => {
    expect(freezeOn('2027-01-01')).toMatchObject({ day: '2027-07-12', dayLabel: 'Mon 12 Jul' });
    expect(freezeOn('2027-01-01', 'America/New_York')).toMatchObject({ day: '2027-07-11' });
  });

  it('count the last fortnight before the freeze, and neither more nor what is past', () => {
    const noteOn = (today: string) => freezeOn(today)?.note?.text;
    expect(noteOn('2027-06-27')).toBeUndefined();
    expect(noteOn('2027-06-28')).toBe('14 days left');
    expect(noteOn('2027-07-11')).toBe('1 day left');
    expect(noteOn('2027-07-12')).toBe('today');
    expect(noteOn('2027-07-13')).toBeUndefined();
  });
});
