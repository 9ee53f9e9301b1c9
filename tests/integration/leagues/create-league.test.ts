import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { listDivisionViews } from '@/db/queries/division-view';
import { listSeasons } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { createLeague } from '@/lib/use-cases/leagues/create-league';
import { createLeagueSchema, type CreateLeagueInput } from '@/lib/use-cases/leagues/new-league-schemas';
import { findInvitation } from '@/lib/use-cases/people/find-invitation';
import { listLetters, makePerson, makeRequest, readToken, type MadePerson } from '../../factories/people';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const preset = listCataloguePresets()[0];
const input = (name: string, more: Partial<CreateLeagueInput> = {}): CreateLeagueInput => ({
  league: { name, timeZone: 'America/Chicago', unit: 'in', paper: 'Letter', currency: 'USD' },
  season: {
    name: 'Spring 2027',
    sport: 'basketball',
    rosterOpensOn: '2027-03-02',
    freezesAt: '2027-03-20T18:00',
    releaseOn: null,
    handOutOn: '2027-04-20',
    firstMatchOn: '2027-04-24',
  },
  division: {
    name: 'Under 12 mixed',
    ageBand: '10 to 12',
    leastPlayers: '8',
    mostPlayers: '15',
    starterKitId: 'jersey-and-shorts',
    presetId: preset?.id ?? null,
  },
  managers: '',
  ...more,
});
const create = (person: MadePerson, given: CreateLeagueInput) =>
  createLeague(person.ctx, createLeagueSchema.parse(given));
const readLeagues = async (person: MadePerson) =>
  (await findSignedInPerson({ userId: person.id, sessionVersion: 1 }))?.leagues ?? [];
const issues = (given: CreateLeagueInput) =>
  createLeagueSchema
    .safeParse(given)
    .error?.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);

describe('creating a league', () => {
  it('makes the league, its season, rules in force and a division with garments, run by whoever made it', async () => {
    const person = await makePerson();
    expect(await create(person, input('Bergmühle Hoops'))).toEqual({
      league: 'bergmuhle-hoops',
      season: 'spring-2027',
    });
    const [entry] = await readLeagues(person);
    expect(entry?.actor.roles).toEqual(['league admin']);
    expect(entry?.league).toMatchObject({ name: 'Bergmühle Hoops', currentSeason: { slug: 'spring-2027' } });

    const leagueId = entry?.league.id ?? '';
    const { seasons, divisions } = await withLeague(leagueId, async (tx) => {
      const list = await listSeasons(tx);
      return { seasons: list, divisions: await listDivisionViews(tx, list[0]?.id ?? '') };
    });
    // Six in the evening in Chicago, five hours behind UTC in that week.
    expect(seasons.map((season) => season.freezesAt.toISOString())).toEqual(['2027-03-20T23:00:00.000Z']);
    expect(divisions).toMatchObject([
      { name: 'Under 12 mixed', leastPlayers: 8, mostPlayers: 15, rules: { version: 1 } },
    ]);
    expect(divisions[0]?.garments.map((garment) => garment.code)).toEqual(['jersey', 'shorts']);
    expect(divisions[0]?.rules?.ruleSet.citations.length).toBeGreaterThan(0);
    const history = await queryAsAdmin<{ type: string }>(
      'select type from audit_events where league_id = $1 order by type',
      [leagueId],
    );
    expect(history.map((event) => event.type)).toEqual([
      'division added',
      'league created',
      'rule set put in force',
      'season opened',
    ]);
    const jobs = await queryAsAdmin<{ run_at: Date }>(
      `select run_at from graphile_worker.jobs where task_identifier = 'freeze-rosters'`,
    );
    expect(jobs.map((job) => job.run_at.toISOString())).toEqual(['2027-03-20T23:00:00.000Z']);
  });

  it('finds a free address among leagues it cannot see, also when five ask for one name at the same moment', async () => {
    const people = await Promise.all(Array.from({ length: 5 }, () => makePerson()));
    const made = await Promise.all(people.map((person) => create(person, input('River League'))));
    expect(made.map((entry) => entry.league).sort()).toEqual([
      'river-league',
      'river-league-2',
      'river-league-3',
      'river-league-4',
      'river-league-5',
    ]);
  });

  it('takes no address that is a page already', async () => {
    const person = await makePerson();
    expect(await create(person, input('Settings'))).toMatchObject({ league: 'settings-1' });
  });

  it('invites managers by links that bring the role without teams yet', async () => {
    const person = await makePerson();
    await create(
      person,
      input('Inviting', { managers: 'ann@club.example, BEA@club.example\nann@club.example' }),
    );
    expect(await listLetters('ann@club.example')).toHaveLength(1);
    const token = await readToken('bea@club.example', 'invitation');
    expect(await findInvitation(makeRequest(), token)).toMatchObject({
      state: 'open',
      league: 'Inviting',
      role: 'team manager',
      teams: [],
      invitedBy: person.name,
    });
  });

  it('leaves nothing behind when its last part fails', async () => {
    const person = await makePerson();
    const given = input('Half A League');
    const failing = create(person, {
      ...given,
      division: { ...given.division, starterKitId: 'no such kit' },
    });
    await expect(failing).rejects.toMatchObject({ code: 'not-found' });
    expect(await readLeagues(person)).toEqual([]);
    expect(await queryAsAdmin(`select id from leagues where name = 'Half A League'`)).toEqual([]);
  });

  it('works with rules of the own and without a code', async () => {
    const person = await makePerson();
    const given = input('Own Rules');
    await create(person, { ...given, division: { ...given.division, presetId: null } });
    const [entry] = await readLeagues(person);
    const rows = await queryAsAdmin<{ name: string; preset_id: string | null }>(
      'select name, preset_id from rule_sets where league_id = $1',
      [entry?.league.id],
    );
    expect(rows).toEqual([{ name: 'Own number rules', preset_id: null }]);
  });

  it('is done ten times a day at most by one person', async () => {
    const person = await makePerson();
    const answers = await Promise.allSettled(
      Array.from({ length: 12 }, (_, at) => create(person, input(`Busy ${at}`))),
    );
    expect(answers.filter((answer) => answer.status === 'fulfilled')).toHaveLength(10);
  });

  it('refuses dates out of order, limits the wrong way round and what is no address, each by its field', () => {
    const given = input('Wrong');
    expect(issues({ ...given, season: { ...given.season, handOutOn: '2027-03-19' } })).toEqual([
      expect.stringMatching(/^season.handOutOn: Hand-out is at least a day after the freeze/),
    ]);
    expect(issues({ ...given, season: { ...given.season, freezesAt: '2027-02-30T18:00' } })).toEqual([
      'season.freezesAt: Choose a day and a time.',
    ]);
    expect(issues({ ...given, division: { ...given.division, leastPlayers: '16' } })).toEqual([
      'division.mostPlayers: The most players cannot be fewer than the least.',
    ]);
    expect(issues({ ...given, managers: 'ann@club.example bea' })).toEqual([
      'managers: “bea” is not an e-mail address.',
    ]);
  });
});
