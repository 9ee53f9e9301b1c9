import { describe, expect, it } from 'vitest';
import { exportReadiness } from '@/lib/use-cases/readiness/export-readiness';
import { listReadiness } from '@/lib/use-cases/readiness/list-readiness';
import { remindManagers } from '@/lib/use-cases/readiness/remind-managers';
import { buildMember, buildTeam } from '../../factories/league';
import { listLetters } from '../../factories/people';
import { buildRoster, listRosterEvents, type BuiltRoster } from '../../factories/rosters';

const list = (built: BuiltRoster, ctx = built.admin) => listReadiness(ctx, { season: built.season.slug });
const remind = (built: BuiltRoster, teamIds: string[], ctx = built.admin) =>
  remindManagers(ctx, { season: built.season.slug, teamIds });

describe('readiness', () => {
  it('shows an admin every team with what holds it, and a manager only the teams they are named for', async () => {
    const built = await buildRoster({ players: [{ number: '7' }, { number: '7' }, { number: '8' }] });
    await buildTeam(built.league, built.division, { name: 'Avocets', players: [{}], state: 'signed off' });
    const seen = await list(built);
    expect(seen.teams.map(({ name, group, holds }) => [name, group, holds])).toEqual([
      ['Avocets', 'ready', 'Signed off Tue 2 Mar'],
      ['Egrets', 'collecting', 'Nothing to fix; not submitted yet'],
      ['Herons', 'blocked', '2 players wear 7'],
    ]);
    expect(seen.teams[2]?.areas.numbers).toEqual({ blockers: 2, cautions: 0 });
    expect(seen.may).toEqual({ remind: true, batch: true });
    const own = await list(built, built.ana);
    expect(own.teams.map(({ name }) => name)).toEqual(['Herons']);
    expect(own.may).toEqual({ remind: false, batch: false });
  });

  it('is not for referees, and of another league not there at all', async () => {
    const built = await buildRoster();
    const referee = await buildMember(built.league, 'referee');
    await expect(list(built, referee.ctx)).rejects.toMatchObject({ code: 'forbidden' });
    const elsewhere = await buildRoster();
    await expect(list(built, elsewhere.admin)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('goes out as CSV with formula-looking names neutralised', async () => {
    const built = await buildRoster();
    await buildTeam(built.league, built.division, { name: '=SUM(A1)', slug: 'sum' });
    const { name, csv } = await exportReadiness(built.admin, { season: built.season.slug });
    expect(name).toBe(`${built.league.slug}-${built.season.slug}-readiness.csv`);
    expect(csv).toContain('"\'=SUM(A1)"');
    expect(csv.split('\r\n').filter(Boolean)).toHaveLength(4);
  });
});

describe('a reminder', () => {
  it('goes to every manager of a team that is still open, says what holds it, and is kept in the history', async () => {
    const built = await buildRoster({ players: [{ number: '7' }, { number: '7' }] });
    expect(await remind(built, [built.team.id, built.other.id])).toEqual({ teams: 2, people: 3, leftOut: 0 });
    for (const email of Object.values(built.emails)) {
      const [letter, ...others] = await listLetters(email);
      expect(others).toEqual([]);
      expect(letter).toMatchObject({
        template: 'roster-reminder',
        params: {
          team: 'Herons',
          holds: '2 players wear 7.',
          freezes: 'Friday 12 March at 18:00',
          link: `http://localhost:3000/${built.league.slug}/${built.season.slug}/rosters/herons`,
        },
      });
    }
    expect(await listRosterEvents(built.season.id)).toMatchObject([
      { type: 'managers reminded', data: { teams: 2, people: 3 } },
    ]);
  });

  it('goes out once a day for a team, also when the button is pressed twice at once', async () => {
    const built = await buildRoster();
    const answers = await Promise.allSettled([
      remind(built, [built.team.id]),
      remind(built, [built.team.id]),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await listLetters(built.emails.ana)).toHaveLength(1);
    // A team that has had none today is still reminded; the other is said to be left out.
    expect(await remind(built, [built.team.id, built.other.id])).toMatchObject({ teams: 1, leftOut: 1 });
  });

  it('leaves out teams that have handed in or have no manager, and says so when nobody is left', async () => {
    const built = await buildRoster();
    const done = await buildTeam(built.league, built.division, { players: [{}], state: 'submitted' });
    await buildMember(built.league, 'team manager', { teamIds: [done.id] });
    const orphan = await buildTeam(built.league, built.division);
    await expect(remind(built, [done.id, orphan.id])).rejects.toMatchObject({ code: 'conflict' });
  });

  it('reaches no team of another league, and is for admins only', async () => {
    const built = await buildRoster();
    const elsewhere = await buildRoster();
    await expect(remind(built, [elsewhere.team.id])).rejects.toMatchObject({ code: 'conflict' });
    expect(await listLetters(elsewhere.emails.ana)).toEqual([]);
    await expect(remind(built, [built.team.id], built.ana)).rejects.toMatchObject({ code: 'forbidden' });
  });
});
