import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { changeLeagueSettings } from '@/lib/use-cases/leagues/change-league-settings';
import { getLeagueSettings } from '@/lib/use-cases/leagues/get-league-settings';
import { changeLeagueSchema } from '@/lib/use-cases/leagues/league-schemas';
import { makePerson } from '../../factories/people';
import { makeStaffedLeague } from '../../factories/staffed-league';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

describe('the settings of a league', () => {
  it('are kept, and the history says which changed from what to what', async () => {
    const league = await makeStaffedLeague();
    const ctx = await league.actAs(league.admin);
    const settings = await getLeagueSettings(ctx);
    await changeLeagueSettings(ctx, changeLeagueSchema.parse({ ...settings, unit: 'in', contactEmail: '' }));
    expect(await getLeagueSettings(ctx)).toEqual({ ...settings, unit: 'in', rowVersion: 2 });
    const events = await queryAsAdmin('select data from audit_events where league_id = $1', [league.id]);
    expect(events).toEqual([{ data: { changes: { unit: { from: 'mm', to: 'in' } } } }]);
  });

  it('are saved by the first of five who opened them, and the others are told', async () => {
    const league = await makeStaffedLeague();
    const ctx = await league.actAs(league.admin);
    const settings = await getLeagueSettings(ctx);
    const answers = await Promise.allSettled(
      Array.from({ length: 5 }, (_, at) =>
        changeLeagueSettings(ctx, changeLeagueSchema.parse({ ...settings, name: `Name ${at}` })),
      ),
    );
    expect(answers.filter((answer) => answer.status === 'fulfilled')).toHaveLength(1);
    for (const answer of answers) {
      if (answer.status === 'rejected') expect(answer.reason).toMatchObject({ code: 'conflict' });
    }
  });

  it('are written to the history only when something changed', async () => {
    const league = await makeStaffedLeague();
    const ctx = await league.actAs(league.admin);
    await changeLeagueSettings(ctx, await getLeagueSettings(ctx));
    expect(await queryAsAdmin('select id from audit_events where league_id = $1', [league.id])).toEqual([]);
  });

  it('refuse a zone, a currency and an address that do not exist', () => {
    const good = {
      name: 'Tern',
      timeZone: 'Europe/London',
      unit: 'mm',
      paper: 'A4',
      currency: 'GBP',
      rowVersion: 1,
    };
    const wrong = (part: object) =>
      changeLeagueSchema.safeParse({ ...good, ...part }).error?.issues.map((issue) => issue.path.join('.'));
    expect(changeLeagueSchema.safeParse(good).success).toBe(true);
    expect(wrong({ timeZone: 'Mars/Olympus' })).toEqual(['timeZone']);
    expect(wrong({ currency: 'gbp' })).toEqual(['currency']);
    expect(wrong({ contactEmail: 'nobody' })).toEqual(['contactEmail']);
    expect(wrong({ name: '  ' })).toEqual(['name']);
    expect(wrong({ name: 'two\nlines' })).toEqual(['name']);
  });

  it('are for league admins', async () => {
    const league = await makeStaffedLeague();
    const manager = await makePerson();
    await league.give(manager, 'team manager', { teamIds: [league.teams[0]?.id ?? ''] });
    await expect(getLeagueSettings(await league.actAs(manager))).rejects.toMatchObject({ code: 'forbidden' });
  });
});
