import { randomUUID } from 'node:crypto';
import { insertDivision } from '@/db/queries/divisions';
import { replaceGarments } from '@/db/queries/garments';
import { insertSeason, setCurrentSeason } from '@/db/queries/seasons';
import { insertTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import type { Role } from '@/lib/domain/access/permissions';
import type { Kit, TeamKits } from '@/lib/domain/kit/kit';
import type { LeagueSummary } from '@/lib/domain/league/league';
import { makeSlug } from '@/lib/domain/league/slug';
import { numberKey } from '@/lib/domain/numbers/number-key';
import type { Garment, RosterLine } from '@/lib/domain/roster/player';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import { makeBlankRuleSet } from '@/lib/domain/rules/blank-rule-set';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import type { ActorContext } from '@/lib/use-cases/context';
import { makePerson, makeRequest, type MadePerson } from './people';

// Everything is written as the runtime role, inside its league. Each builder makes what is not given and answers the
// ids; `given` overrides single fields.

let serial = 0;
const nextSerial = () => (serial += 1);

export const someKit: Kit = {
  name: 'navy',
  body: '#14375e',
  sleeves: '#14375e',
  number: '#ffffff',
  outline: null,
};
export const someGarments: Garment[] = [
  {
    code: 'jersey',
    name: 'Jersey',
    worn: 'home and away',
    numbered: true,
    named: true,
    sizes: [
      { code: 'YM', label: 'Youth medium' },
      { code: 'YL', label: 'Youth large' },
      { code: 'AS', label: 'Adult small' },
    ],
  },
];
/** Any number to 99, no two alike in a team; sizes and roles are not asked for. */
export const someRules: RuleSet = {
  ...makeBlankRuleSet('Any number', 'basketball'),
  sizes: { weight: 'off' },
};

/** A league in Ireland's time zone, with no season yet. */
export async function buildLeague(
  given: Partial<Omit<LeagueSummary, 'currentSeason'>> = {},
): Promise<LeagueSummary> {
  const n = nextSerial();
  const league: LeagueSummary = {
    id: randomUUID(),
    slug: `league-${n}`,
    name: `League ${n}`,
    timeZone: 'Europe/Dublin',
    unit: 'mm',
    paper: 'A4',
    currency: 'EUR',
    ...given,
    currentSeason: null,
  };
  await withLeague(league.id, (tx) =>
    tx
      .insertInto('leagues')
      .values({
        id: league.id,
        slug: league.slug,
        name: league.name,
        time_zone: league.timeZone,
        unit: league.unit,
        paper: league.paper,
        currency: league.currency,
        created_at: makeRequest().now,
      })
      .execute(),
  );
  return league;
}

export type BuiltSeason = { id: string; slug: string; name: string };

/** A season whose freeze is ten days after `makeRequest()`; it becomes the league's current one unless told otherwise. */
export async function buildSeason(
  league: LeagueSummary,
  given: Partial<{
    name: string;
    slug: string;
    sport: string;
    rosterOpensOn: string;
    freezesAt: Date;
    releaseOn: string | null;
    handOutOn: string;
    firstMatchOn: string;
    current: boolean;
  }> = {},
): Promise<BuiltSeason> {
  const { current = true, ...fields } = given;
  const name = fields.name ?? `Season ${nextSerial()}`;
  const season = { id: randomUUID(), slug: fields.slug ?? makeSlug(name, 'season'), name };
  await withLeague(league.id, async (tx) => {
    await insertSeason(tx, {
      sport: 'basketball',
      rosterOpensOn: '2027-02-15',
      freezesAt: new Date('2027-03-12T18:00:00Z'),
      releaseOn: '2027-03-15',
      handOutOn: '2027-04-10',
      firstMatchOn: '2027-04-17',
      ...fields,
      ...season,
      now: makeRequest().now,
    });
    if (current) await setCurrentSeason(tx, season.id);
  });
  return season;
}

/** A rule set with one version in force. */
export async function buildRuleSet(
  league: LeagueSummary,
  given: { name?: string; rules?: Partial<RuleSet> } = {},
): Promise<{ id: string; versionId: string; rules: RuleSet }> {
  const name = given.name ?? `Rules ${nextSerial()}`;
  const rules = { ...someRules, ...given.rules, name };
  const id = randomUUID();
  const versionId = randomUUID();
  const now = makeRequest().now;
  await withLeague(league.id, async (tx) => {
    await tx
      .insertInto('rule_sets')
      .values({ league_id: league.id, id, name, preset_id: null, created_at: now })
      .execute();
    await tx
      .insertInto('rule_set_versions')
      .values({
        league_id: league.id,
        id: versionId,
        rule_set_id: id,
        version: 1,
        state: 'in force',
        in_force_from: '2027-01-01',
        body: JSON.stringify(rules),
        created_by: null,
        created_at: now,
      })
      .execute();
  });
  return { id, versionId, rules };
}

export type BuiltDivision = { id: string; slug: string; name: string; seasonId: string; ruleSetId: string };

/** A division of up to 200 players with one garment, under a rule set of its own unless one is given. */
export async function buildDivision(
  league: LeagueSummary,
  season: { id: string },
  given: Partial<{
    name: string;
    slug: string;
    ageBand: string;
    level: string;
    ruleSetId: string;
    leastPlayers: number;
    mostPlayers: number;
    freezesAt: Date | null;
    garments: Garment[];
  }> = {},
): Promise<BuiltDivision> {
  const name = given.name ?? `Division ${nextSerial()}`;
  const ruleSetId = given.ruleSetId ?? (await buildRuleSet(league)).id;
  const division = {
    id: randomUUID(),
    slug: given.slug ?? makeSlug(name, 'division'),
    name,
    seasonId: season.id,
    ruleSetId,
  };
  await withLeague(league.id, async (tx) => {
    await insertDivision(tx, {
      ageBand: given.ageBand ?? '',
      level: given.level ?? '',
      leastPlayers: given.leastPlayers ?? 0,
      mostPlayers: given.mostPlayers ?? 200,
      freezesAt: given.freezesAt ?? null,
      ...division,
      now: makeRequest().now,
    });
    await replaceGarments(tx, division.id, given.garments ?? someGarments, randomUUID);
  });
  return division;
}

export type BuiltTeam = { id: string; slug: string; name: string; divisionId: string; rosterId: string };

/** A team in navy with an open, empty roster, or one with `players` brought to `state`. */
export async function buildTeam(
  league: LeagueSummary,
  division: { id: string; seasonId: string },
  given: Partial<{
    name: string;
    slug: string;
    kits: TeamKits;
    players: Partial<RosterLine>[];
    state: RosterState;
  }> = {},
): Promise<BuiltTeam> {
  const name = given.name ?? `Team ${nextSerial()}`;
  const team = {
    id: randomUUID(),
    slug: given.slug ?? makeSlug(name, 'team'),
    name,
    divisionId: division.id,
    rosterId: randomUUID(),
  };
  const now = makeRequest().now;
  await withLeague(league.id, (tx) =>
    insertTeam(tx, {
      ...team,
      seasonId: division.seasonId,
      kits: given.kits ?? { home: someKit, away: null },
      now,
      userId: null,
    }),
  );
  for (const line of given.players ?? []) await buildPlayer(league, team, line);
  if (given.state !== undefined) await moveRoster(league, team.rosterId, given.state);
  return team;
}

/** Writes the state of a roster as it is, with the times that belong to it and no guard but the database's own. */
export async function moveRoster(league: LeagueSummary, rosterId: string, state: RosterState): Promise<void> {
  const { now } = makeRequest();
  const done = state === 'signed off' || state === 'frozen';
  await withLeague(league.id, (tx) =>
    tx
      .updateTable('rosters')
      .set({
        state,
        submitted_at: done || state === 'submitted' ? now : null,
        signed_off_at: done ? now : null,
        frozen_at: state === 'frozen' ? now : null,
        return_reason: state === 'returned' ? 'Ask the family about the size.' : null,
      })
      .where('league_id', '=', league.id)
      .where('id', '=', rosterId)
      .execute(),
  );
}

/** One player at the end of a roster, whose number is the next free one unless given. */
export async function buildPlayer(
  league: LeagueSummary,
  team: { rosterId: string },
  given: Partial<RosterLine> = {},
  rules: RuleSet = someRules,
): Promise<{ id: string; position: number }> {
  const id = randomUUID();
  return withLeague(league.id, async (tx) => {
    const { count } = await tx
      .selectFrom('players')
      .select((eb) => eb.fn.countAll<number>().as('count'))
      .where('league_id', '=', league.id)
      .where('roster_id', '=', team.rosterId)
      .executeTakeFirstOrThrow();
    const number = given.number ?? String(count + 1);
    await tx
      .insertInto('players')
      .values({
        league_id: league.id,
        id,
        roster_id: team.rosterId,
        position: count,
        name: given.name ?? `Alba Wren${count === 0 ? '' : ` ${count + 1}`}`,
        name_on_back: given.nameOnBack ?? '',
        number,
        role: given.role ?? '',
        sizes: JSON.stringify(given.sizes ?? { jersey: 'YM' }),
        extra: JSON.stringify({}),
        number_key: numberKey(rules, number),
        updated_at: makeRequest().now,
        updated_by: null,
      })
      .execute();
    return { id, position: count };
  });
}

/** A shop that decorates for the league. */
export async function buildShop(
  league: LeagueSummary,
  given: { name?: string } = {},
): Promise<{ id: string; name: string }> {
  const shop = { id: randomUUID(), name: given.name ?? `Shop ${nextSerial()}` };
  await withLeague(league.id, (tx) =>
    tx
      .insertInto('shops')
      .values({ league_id: league.id, ...shop, created_at: makeRequest().now })
      .execute(),
  );
  return shop;
}

/** Makes a person (somebody new unless given) a member, and answers the membership's id and their context in the league. */
export async function buildMember(
  league: LeagueSummary,
  role: Role,
  given: { person?: MadePerson; teamIds?: string[]; shopId?: string } = {},
): Promise<{ id: string; person: MadePerson; ctx: ActorContext }> {
  const person = given.person ?? (await makePerson());
  const id = randomUUID();
  await withLeague(league.id, async (tx) => {
    await tx
      .insertInto('memberships')
      .values({
        league_id: league.id,
        id,
        user_id: person.id,
        role,
        shop_id: given.shopId ?? null,
        created_at: makeRequest().now,
      })
      .execute();
    for (const teamId of given.teamIds ?? []) {
      await tx
        .insertInto('membership_teams')
        .values({ league_id: league.id, membership_id: id, team_id: teamId })
        .execute();
    }
  });
  const actor = {
    userId: person.id,
    name: person.name,
    leagueId: league.id,
    roles: [role],
    teamIds: given.teamIds ?? [],
    shopIds: given.shopId === undefined ? [] : [given.shopId],
  };
  return { id, person, ctx: { ...makeRequest(), actor, league } };
}

/** The same context so many minutes later. */
export const laterBy = (ctx: ActorContext, minutes: number): ActorContext => ({
  ...ctx,
  now: new Date(ctx.now.getTime() + minutes * 60_000),
});

/**
 * One league with everything in it: a season, a rule set, a division, three teams (`teams[0]` is the manager's, has
 * two players and an open roster; `teams[1]` is signed off with two; `teams[2]` is empty), a shop, and a context for
 * each role.
 */
export async function buildFurnishedLeague(given: { decorator?: MadePerson } = {}) {
  const bare = await buildLeague();
  const season = await buildSeason(bare);
  const league: LeagueSummary = { ...bare, currentSeason: season };
  const ruleSet = await buildRuleSet(league);
  const division = await buildDivision(league, season, { ruleSetId: ruleSet.id });
  const [own, signedOff, empty] = [
    await buildTeam(league, division, { players: [{}, {}] }),
    await buildTeam(league, division, { players: [{}, {}], state: 'signed off' }),
    await buildTeam(league, division),
  ];
  const shop = await buildShop(league);
  const admin = await buildMember(league, 'league admin');
  const manager = await buildMember(league, 'team manager', { teamIds: [own.id] });
  const referee = await buildMember(league, 'referee');
  const decorator = await buildMember(league, 'decorator', {
    shopId: shop.id,
    ...(given.decorator === undefined ? {} : { person: given.decorator }),
  });
  return {
    league,
    season,
    ruleSet,
    division,
    teams: [own, signedOff, empty] as const,
    shop,
    members: { admin, manager, referee, decorator },
    admin: admin.ctx,
    manager: manager.ctx,
    referee: referee.ctx,
    decorator: decorator.ctx,
  };
}
export type FurnishedLeague = Awaited<ReturnType<typeof buildFurnishedLeague>>;

/** One furnished league, or two that share nothing but their decorator: for tests of what one may see of the other. */
export function buildWorld(given: { leagues: 2 }): Promise<[FurnishedLeague, FurnishedLeague]>;
export function buildWorld(given?: { leagues: 1 }): Promise<[FurnishedLeague]>;
export async function buildWorld(given: { leagues: 1 | 2 } = { leagues: 1 }): Promise<FurnishedLeague[]> {
  const first = await buildFurnishedLeague();
  if (given.leagues === 1) return [first];
  return [first, await buildFurnishedLeague({ decorator: first.members.decorator.person })];
}
