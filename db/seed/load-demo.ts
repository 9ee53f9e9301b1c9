import { makeSnapshot } from '@/lib/domain/batch/make-snapshot';
import { batchStates, type BatchState } from '@/lib/domain/batch/batch-state';
import { writeCanonicalJson } from '@/lib/domain/batch/canonical-json';
import { addDays } from '@/lib/domain/dates/day';
import { toInstant } from '@/lib/domain/dates/zone';
import { makeSlug } from '@/lib/domain/league/slug';
import { numberKey } from '@/lib/domain/numbers/number-key';
import type { Player } from '@/lib/domain/roster/player';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import { applyDivisionLimits } from '@/lib/domain/rules/apply-division-limits';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { sha256, sha256Bytes } from '@/lib/platform/ids';
import { hashPassword } from '@/lib/platform/passwords';
import { insertAuditEvent } from '../queries/audit';
import { insertBatch, replaceBatchRosters, updateBatchState } from '../queries/batches';
import { insertBundle } from '../queries/bundles';
import { enqueueJob } from '../queries/jobs';
import { withLeague, withUser, type LeagueTx } from '../tenant';
import { makeId } from './invent';
import { makePlayers } from './make-players';
import { pellbrookValley } from './pellbrook-valley';
import type { DemoLeague, DemoStory, DemoTeam } from './scenario';
import { ternEstuary } from './tern-estuary';

/** The password of every demo account. Only ever loaded in demo mode. */
export const demoPassword = 'raglan-demo-2027';

const stateOfStory: Partial<Record<DemoStory, RosterState>> = {
  returned: 'returned',
  submitted: 'submitted',
  'zero and double zero': 'submitted',
  'signed off': 'signed off',
  'in the held batch': 'signed off',
  'batch on press': 'frozen',
  'batch received': 'frozen',
};

type Clock = { today: string; now: Date };

/**
 * Loads the invented leagues, each in one transaction; a league that is there already is left as it is. `now` sets the
 * dates (the freeze is three days on), everything else is the same every time. Throws when a team would not show what
 * its story says.
 */
export async function loadDemo(now: Date): Promise<{ loaded: boolean }> {
  const clock = { now, today: now.toISOString().slice(0, 10) };
  let passwordHash: string | undefined;
  for (const league of [ternEstuary, pellbrookValley]) {
    const id = makeId(league.slug);
    const known = await withLeague(id, (tx) =>
      tx.selectFrom('leagues').select('id').where('id', '=', id).executeTakeFirst(),
    );
    if (known) continue;
    passwordHash ??= await hashPassword(demoPassword);
    await loadPeople(league, passwordHash, now);
    await withLeague(id, (tx) => loadLeague(tx, league, clock));
  }
  return { loaded: passwordHash !== undefined };
}

/** The first Saturday on or after a day: hand-outs and matches are on Saturdays here. */
const nextSaturday = (day: string): string =>
  addDays(day, (6 - new Date(`${day}T00:00:00Z`).getUTCDay() + 7) % 7);

const shortName = (league: DemoLeague): string => league.slug.split('-')[0] ?? league.slug;

/** Everybody of a demo league: the three roles of its own, one more manager for every four teams, and the shop's decorator. */
function listPeople(league: DemoLeague) {
  const short = shortName(league);
  const teams = league.divisions.flatMap((division) => division.teams);
  const named = short === 'tern' ? ['Otters', 'Herons'] : ['Hawthorns', 'Millrace'];
  const others = teams.filter((team) => !named.includes(team.name) && team.story !== 'no roster');
  const groups = Array.from({ length: Math.ceil(others.length / 4) }, (_, index) =>
    others.slice(index * 4, index * 4 + 4),
  );
  return {
    coordinator: {
      email: `coordinator@${short}.example`,
      name: short === 'tern' ? 'Maren Tidewell' : 'Colm Pellbrook',
    },
    referee: { email: `referee@${short}.example`, name: short === 'tern' ? 'Ruben Falk' : 'Hazel Ormerod' },
    decorator: { email: 'decorator@quay.example', name: 'Dina Quayle' },
    managers: [
      {
        email: `manager@${short}.example`,
        name: short === 'tern' ? 'Nia Brennock' : 'Owen Lathe',
        teams: named,
      },
      ...groups.map((group, index) => ({
        email: `manager${index + 2}@${short}.example`,
        name:
          [
            'Bea Arkwright',
            'Cal Winder',
            'Dot Fenn',
            'Eli Marsh',
            'Fay Holt',
            'Gil Rook',
            'Hal Sykes',
            'Isa Lund',
          ][index] ?? 'Jo Reed',
        teams: group.map((team) => team.name),
      })),
    ],
  };
}

async function loadPeople(league: DemoLeague, passwordHash: string, now: Date): Promise<void> {
  const { coordinator, referee, decorator, managers } = listPeople(league);
  for (const person of [coordinator, referee, decorator, ...managers]) {
    const id = makeId('user', person.email);
    await withUser(id, (tx) =>
      tx
        .insertInto('users')
        .values({ id, email: person.email, name: person.name, password_hash: passwordHash, created_at: now })
        // The decorator is met again in the second league.
        .onConflict((conflict) => conflict.doNothing())
        .execute(),
    );
  }
}

async function loadLeague(tx: LeagueTx, league: DemoLeague, clock: Clock): Promise<void> {
  const people = listPeople(league);
  const admin = makeId('user', people.coordinator.email);
  const created = new Date(clock.now.getTime() - 45 * 86_400_000);
  let event = 0;
  const stampAt = (now: Date) => ({
    now,
    requestId: 'demo',
    newId: () => makeId(league.slug, 'event', (event += 1)),
    userId: admin,
  });

  await tx
    .insertInto('leagues')
    .values({
      id: tx.leagueId,
      slug: league.slug,
      name: league.name,
      time_zone: league.timeZone,
      unit: league.unit,
      paper: league.paper,
      currency: league.currency,
      contact_email: people.coordinator.email,
      ship_to: league.shipTo,
      current_season_id: null,
      created_at: created,
    })
    .execute();
  await insertAuditEvent(tx, stampAt(created), {
    type: 'league created',
    subjectId: tx.leagueId,
    data: { name: league.name },
  });
  const shopId = makeId(league.slug, 'shop');
  await tx
    .insertInto('shops')
    .values({ league_id: tx.leagueId, id: shopId, name: 'Quay Street press room', created_at: created })
    .execute();
  const seasonId = await loadSeason(tx, league, clock, created);
  await insertAuditEvent(tx, stampAt(created), {
    type: 'season opened',
    subjectId: seasonId,
    data: { name: seasonName(league, clock) },
  });

  for (const rules of league.ruleSets) {
    const preset = findCataloguePreset(rules.preset);
    if (!preset) throw new Error(`the catalogue has no ${rules.preset}`);
    const id = makeId(league.slug, 'rules', rules.key);
    await tx
      .insertInto('rule_sets')
      .values({ league_id: tx.leagueId, id, name: rules.name, preset_id: rules.preset, created_at: created })
      .execute();
    await tx
      .insertInto('rule_set_versions')
      .values({
        league_id: tx.leagueId,
        id: makeId(league.slug, 'version', rules.key),
        rule_set_id: id,
        version: 1,
        state: 'in force',
        in_force_from: created.toISOString().slice(0, 10),
        body: JSON.stringify(adaptPreset(preset.ruleSet, rules.name)),
        created_by: admin,
        created_at: created,
      })
      .execute();
    await insertAuditEvent(tx, stampAt(created), {
      type: 'rule set put in force',
      subjectId: id,
      data: { name: rules.name, version: 1 },
    });
  }

  for (const [position, division] of league.divisions.entries()) {
    const divisionId = makeId(league.slug, 'division', division.name);
    await tx
      .insertInto('divisions')
      .values({
        league_id: tx.leagueId,
        id: divisionId,
        season_id: seasonId,
        slug: makeSlug(division.name, 'division'),
        name: division.name,
        age_band: division.ageBand,
        level: division.level,
        rule_set_id: makeId(league.slug, 'rules', division.ruleSet),
        least_players: division.least,
        most_players: division.most,
        position,
        created_at: created,
      })
      .execute();
    for (const [index, garment] of division.garments.entries()) {
      await tx
        .insertInto('garments')
        .values({
          league_id: tx.leagueId,
          id: makeId(divisionId, garment.code),
          division_id: divisionId,
          ...garment,
          sizes: JSON.stringify(garment.sizes),
          position: index,
        })
        .execute();
    }
    for (const team of division.teams) {
      await loadTeam(tx, league, { seasonId, divisionId, division, team, clock, created, admin });
    }
  }
  await loadMemberships(tx, league, shopId, created);
  await loadBatches(tx, league, { seasonId, shopId, clock, admin, stampAt });
}

/** What a league would add to a published code: names may be on the back, sizes are asked for, limits hold. */
function adaptPreset(ruleSet: RuleSet, name: string): RuleSet {
  return {
    ...ruleSet,
    name,
    names: { ...ruleSet.names, onBack: 'allowed', mostLetters: 14, weight: 'caution' },
    sizes: { weight: 'caution' },
    roster: { ...ruleSet.roster, weight: 'blocker' },
  };
}

const seasonName = (league: DemoLeague, clock: Clock): string => {
  const handOut = nextSaturday(addDays(clock.today, 28));
  const quarter = Math.floor((Number(handOut.slice(5, 7)) % 12) / 3);
  return `${['Winter', 'Spring', 'Summer', 'Autumn'][quarter]} ${handOut.slice(0, 4)}`;
};

async function loadSeason(tx: LeagueTx, league: DemoLeague, clock: Clock, created: Date): Promise<string> {
  const id = makeId(league.slug, 'season');
  const name = seasonName(league, clock);
  const handOut = nextSaturday(addDays(clock.today, 28));
  const freezesAt = toInstant(`${addDays(clock.today, 3)}T18:00`, league.timeZone).instant;
  await tx
    .insertInto('seasons')
    .values({
      league_id: tx.leagueId,
      id,
      slug: makeSlug(name, 'season'),
      name,
      sport: league.sport,
      roster_opens_on: addDays(clock.today, -30),
      freezes_at: freezesAt,
      release_on: addDays(clock.today, 8),
      hand_out_on: handOut,
      first_match_on: addDays(handOut, 7),
      created_at: created,
    })
    .execute();
  await tx.updateTable('leagues').set({ current_season_id: id }).where('id', '=', tx.leagueId).execute();
  await enqueueJob(
    tx,
    { task: 'freeze-rosters', payload: { leagueId: tx.leagueId, seasonId: id } },
    { key: `freeze:${id}`, runAt: freezesAt },
  );
  return id;
}

type TeamSetting = {
  seasonId: string;
  divisionId: string;
  division: DemoLeague['divisions'][number];
  team: DemoTeam;
  clock: Clock;
  created: Date;
  admin: string;
};

async function loadTeam(tx: LeagueTx, league: DemoLeague, setting: TeamSetting): Promise<void> {
  const { division, team, clock } = setting;
  const id = makeId(league.slug, 'team', team.name);
  await tx
    .insertInto('teams')
    .values({
      league_id: tx.leagueId,
      id,
      season_id: setting.seasonId,
      division_id: setting.divisionId,
      slug: makeSlug(team.name, 'team'),
      name: team.name,
      home_kit: JSON.stringify(team.home),
      away_kit: team.away && JSON.stringify(team.away),
      created_at: setting.created,
    })
    .execute();
  const state = stateOfStory[team.story] ?? 'open';
  const rosterId = makeId(id, 'roster');
  const daysAgo = (days: number) => new Date(clock.now.getTime() - days * 86_400_000);
  const past = state === 'signed off' || state === 'frozen';
  await tx
    .insertInto('rosters')
    .values({
      league_id: tx.leagueId,
      id: rosterId,
      team_id: id,
      state: 'open',
      return_reason:
        state === 'returned'
          ? 'One player has no number yet, and please check the spelling of the names with the families.'
          : null,
      rule_set_version_id: past ? makeId(league.slug, 'version', division.ruleSet) : null,
      submitted_at: state === 'open' ? null : daysAgo(4),
      signed_off_at: past ? daysAgo(3) : null,
      signed_off_by: past ? setting.admin : null,
      frozen_at: state === 'frozen' ? daysAgo(2) : null,
      updated_at: daysAgo(4),
      updated_by: null,
    })
    .execute();

  const rules = ruleSetOf(league, division);
  const lines = makePlayers(team, division);
  const { summary } = checkRoster(rules, lines, division.garments);
  if (state !== 'open' && state !== 'returned' && summary.blockers > 0)
    throw new Error(`demo team ${team.name} has blockers but is ${state}`);
  for (const [position, line] of lines.entries()) {
    await tx
      .insertInto('players')
      .values({
        league_id: tx.leagueId,
        id: makeId(rosterId, position),
        roster_id: rosterId,
        position,
        name: line.name,
        name_on_back: line.nameOnBack,
        number: line.number,
        role: line.role,
        sizes: JSON.stringify(line.sizes),
        extra: '{}',
        number_key: past ? numberKey(rules, line.number) : null,
        updated_at: daysAgo(4),
        updated_by: null,
      })
      .execute();
  }
  // In two steps, as in life: the first one seals the players.
  if (state !== 'open') {
    await tx
      .updateTable('rosters')
      .set({ state })
      .where('league_id', '=', tx.leagueId)
      .where('id', '=', rosterId)
      .execute();
  }
}

function ruleSetOf(league: DemoLeague, division: DemoLeague['divisions'][number]): RuleSet {
  const rules = league.ruleSets.find((entry) => entry.key === division.ruleSet);
  const preset = rules && findCataloguePreset(rules.preset);
  if (!rules || !preset) throw new Error(`demo division ${division.name} has no rules`);
  return applyDivisionLimits(adaptPreset(preset.ruleSet, rules.name), {
    leastPlayers: division.least,
    mostPlayers: division.most,
  });
}

async function loadMemberships(
  tx: LeagueTx,
  league: DemoLeague,
  shopId: string,
  created: Date,
): Promise<void> {
  const { coordinator, referee, decorator, managers } = listPeople(league);
  const rows = [
    { email: coordinator.email, role: 'league admin' as const, shop: null, teams: [] as string[] },
    { email: referee.email, role: 'referee' as const, shop: null, teams: [] },
    { email: decorator.email, role: 'decorator' as const, shop: shopId, teams: [] },
    ...managers.map((manager) => ({
      email: manager.email,
      role: 'team manager' as const,
      shop: null,
      teams: manager.teams,
    })),
  ];
  for (const row of rows) {
    const id = makeId(league.slug, 'membership', row.email, row.role);
    await tx
      .insertInto('memberships')
      .values({
        league_id: tx.leagueId,
        id,
        user_id: makeId('user', row.email),
        role: row.role,
        shop_id: row.shop,
        created_at: created,
      })
      .execute();
    for (const team of row.teams) {
      await tx
        .insertInto('membership_teams')
        .values({ league_id: tx.leagueId, membership_id: id, team_id: makeId(league.slug, 'team', team) })
        .execute();
    }
  }
}

type BatchSetting = {
  seasonId: string;
  shopId: string;
  clock: Clock;
  admin: string;
  stampAt: (now: Date) => { now: Date; requestId: string; newId: () => string; userId: string };
};

async function loadBatches(tx: LeagueTx, league: DemoLeague, setting: BatchSetting): Promise<void> {
  const plans: { story: DemoStory; state: BatchState; daysAgo: number }[] = [
    { story: 'batch received', state: 'received', daysAgo: 20 },
    { story: 'batch on press', state: 'on press', daysAgo: 2 },
    { story: 'in the held batch', state: 'held', daysAgo: 1 },
  ];
  for (const plan of plans) {
    const entries = league.divisions.flatMap((division, position) =>
      division.teams
        .filter((team) => team.story === plan.story)
        .map((team) => ({ division, position, team })),
    );
    if (entries.length === 0) continue;
    const id = makeId(league.slug, 'batch', plan.story);
    const start = toInstant(`${addDays(setting.clock.today, -plan.daysAgo)}T09:12`, league.timeZone).instant;
    const promisedOn = addDays(setting.clock.today, 24 - plan.daysAgo);
    const code = await insertBatch(tx, {
      id,
      seasonId: setting.seasonId,
      shopId: setting.shopId,
      promisedOn,
      now: start,
      userId: setting.admin,
    });
    await replaceBatchRosters(
      tx,
      id,
      entries.map(({ team }) => makeId(makeId(league.slug, 'team', team.name), 'roster')),
    );
    await insertAuditEvent(tx, setting.stampAt(start), {
      type: 'batch held',
      subjectId: id,
      data: { code, teams: entries.length },
    });
    if (plan.state === 'held') continue;

    const snapshot = makeSnapshot({
      batch: {
        id,
        code,
        league: league.name,
        season: seasonName(league, setting.clock),
        shop: 'Quay Street press room',
        promisedOn,
        releasedAt: start.toISOString(),
        timeZone: league.timeZone,
        paper: league.paper,
      },
      entries: entries.map(({ division, position, team }) => ({
        team: {
          id: makeId(league.slug, 'team', team.name),
          name: team.name,
          slug: makeSlug(team.name, 'team'),
          kits: { home: team.home, away: team.away },
        },
        division: { name: division.name, position, garments: division.garments },
        players: makePlayers(team, division).map((line, index): Player => ({
          ...line,
          id: makeId(makeId(makeId(league.slug, 'team', team.name), 'roster'), index),
          position: index,
          extra: {},
        })),
      })),
      hashOf: sha256Bytes,
    });
    const snapshotJson = writeCanonicalJson(snapshot);
    const steps = batchStates.slice(1, batchStates.indexOf(plan.state) + 1);
    for (const [index, state] of steps.entries()) {
      const at = new Date(start.getTime() + index * 3 * 86_400_000);
      await updateBatchState(tx, {
        batchId: id,
        eventId: makeId(id, 'event', state),
        state,
        now: at < setting.clock.now ? at : setting.clock.now,
        userId:
          state === 'released' || state === 'received'
            ? setting.admin
            : makeId('user', 'decorator@quay.example'),
        note: '',
        ...(state === 'released' && { release: { snapshotJson, sha256: sha256(snapshotJson) } }),
      });
    }
    const players = snapshot.teams.reduce((sum, team) => sum + team.players.length, 0);
    await insertAuditEvent(tx, setting.stampAt(start), {
      type: 'batch released',
      subjectId: id,
      data: { code, teams: entries.length, players, sha256: sha256(snapshotJson) },
    });
    await insertBundle(tx, { id: makeId(id, 'bundle'), batchId: id, now: start });
    await enqueueJob(
      tx,
      { task: 'build-bundle', payload: { leagueId: tx.leagueId, batchId: id } },
      { key: `bundle:${id}`, runAt: null },
    );
  }
}
