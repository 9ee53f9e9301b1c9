import { beforeEach, describe, expect, it } from 'vitest';
import { freezeDueRosters } from '@/lib/use-cases/rosters/freeze-due-rosters';
import { buildDivision, buildTeam, buildWorld, type FurnishedLeague } from '../../factories/league';
import { makeRequest } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';

let world: FurnishedLeague;
beforeEach(async () => {
  [world] = await buildWorld();
});

const freezeAt = (time: string) =>
  freezeDueRosters(
    { ...makeRequest(), now: new Date(time) },
    { leagueId: world.league.id, seasonId: world.season.id },
  );
const stateOf = async (rosterId: string) => {
  const [row] = await queryAsAdmin<{ state: string; frozen_at: Date | null }>(
    'select state, frozen_at from rosters where id = $1',
    [rosterId],
  );
  return row;
};

// The season's freeze is on 12 March 2027 at 18:00.
describe('the freeze', () => {
  it('freezes what is signed off and leaves every other roster as it is', async () => {
    const late = await Promise.all(
      (['submitted', 'returned'] as const).map((state) =>
        buildTeam(world.league, world.division, { players: [{}], state }),
      ),
    );
    expect(await freezeAt('2027-03-12T18:00:00Z')).toBe(1);
    const [own, signedOff, empty] = world.teams;
    expect(await stateOf(signedOff.rosterId)).toEqual({
      state: 'frozen',
      frozen_at: new Date('2027-03-12T18:00:00Z'),
    });
    const others = [own, empty, ...late].map(async (team) => (await stateOf(team.rosterId))?.state);
    expect(await Promise.all(others)).toEqual(['open', 'open', 'submitted', 'returned']);
  });

  it('does nothing before its moment', async () => {
    expect(await freezeAt('2027-03-12T17:59:59Z')).toBe(0);
    expect((await stateOf(world.teams[1].rosterId))?.state).toBe('signed off');
  });

  it('changes nothing when the job runs again, and stands in the history once', async () => {
    expect(await freezeAt('2027-03-12T18:00:00Z')).toBe(1);
    expect(await freezeAt('2027-03-13T18:00:00Z')).toBe(0);
    expect((await stateOf(world.teams[1].rosterId))?.frozen_at).toEqual(new Date('2027-03-12T18:00:00Z'));
    const events = await queryAsAdmin(
      `select user_id, data from audit_events where subject_id = $1 and type = 'roster frozen'`,
      [world.teams[1].rosterId],
    );
    expect(events).toEqual([{ user_id: null, data: { team: world.teams[1].name, because: 'date' } }]);
  });

  it('freezes once when two workers run the job at the same moment', async () => {
    const counts = await Promise.all([freezeAt('2027-03-12T18:00:00Z'), freezeAt('2027-03-12T18:00:00Z')]);
    expect(counts.sort()).toEqual([0, 1]);
  });

  it('of a division of its own comes at that division’s moment, before or after the season’s', async () => {
    const [early, late] = [
      await buildDivision(world.league, world.season, { freezesAt: new Date('2027-03-08T12:00Z') }),
      await buildDivision(world.league, world.season, { freezesAt: new Date('2027-03-20T12:00Z') }),
    ];
    const build = (division: typeof early) =>
      buildTeam(world.league, division, { players: [{}], state: 'signed off' });
    const [earlyTeam, lateTeam] = [await build(early), await build(late)];
    const states = async () => [
      (await stateOf(earlyTeam.rosterId))?.state,
      (await stateOf(world.teams[1].rosterId))?.state,
      (await stateOf(lateTeam.rosterId))?.state,
    ];
    await freezeAt('2027-03-08T12:00:00Z');
    expect(await states()).toEqual(['frozen', 'signed off', 'signed off']);
    await freezeAt('2027-03-12T18:00:00Z');
    expect(await states()).toEqual(['frozen', 'frozen', 'signed off']);
    await freezeAt('2027-03-20T12:00:00Z');
    expect(await states()).toEqual(['frozen', 'frozen', 'frozen']);
  });

  it('touches no season of another league that is named with this one', async () => {
    const [mine, theirs] = await buildWorld({ leagues: 2 });
    const ctx = { ...makeRequest(), now: new Date('2027-04-01T00:00:00Z') };
    expect(await freezeDueRosters(ctx, { leagueId: mine.league.id, seasonId: theirs.season.id })).toBe(0);
    expect((await stateOf(theirs.teams[1].rosterId))?.state).toBe('signed off');
  });
});
