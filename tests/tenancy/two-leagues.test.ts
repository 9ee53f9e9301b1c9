import { readdirSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import { permissionTable, type Permission, type Role } from '@/lib/domain/access/permissions';
import { AppError } from '@/lib/platform/errors';
import type { ActorContext } from '@/lib/use-cases/context';
import { buildBundle } from '@/lib/use-cases/batches/build-bundle';
import { changeBatch } from '@/lib/use-cases/batches/change-batch';
import { discardBatch } from '@/lib/use-cases/batches/discard-batch';
import { getBatch, getBundleState } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { getBatchOptions, listBatches } from '@/lib/use-cases/batches/list-batches';
import { listShopBatches } from '@/lib/use-cases/batches/list-shop-batches';
import { markBatch } from '@/lib/use-cases/batches/mark-batch';
import { openBundleFile } from '@/lib/use-cases/batches/open-bundle-file';
import { rebuildBundle } from '@/lib/use-cases/batches/rebuild-bundle';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import { addDivision } from '@/lib/use-cases/divisions/add-division';
import { changeDivision } from '@/lib/use-cases/divisions/change-division';
import { getDivisionForm, listDivisions } from '@/lib/use-cases/divisions/list-divisions';
import { removeDivision } from '@/lib/use-cases/divisions/remove-division';
import { checkMatch } from '@/lib/use-cases/match/check-match';
import { changeManagerTeams } from '@/lib/use-cases/people/change-manager-teams';
import { endRole } from '@/lib/use-cases/people/end-role';
import { invitePerson } from '@/lib/use-cases/people/invite-person';
import { resendInvitation } from '@/lib/use-cases/people/resend-invitation';
import { revokeInvitation } from '@/lib/use-cases/people/revoke-invitation';
import { exportReadiness } from '@/lib/use-cases/readiness/export-readiness';
import { listReadiness } from '@/lib/use-cases/readiness/list-readiness';
import { remindManagers } from '@/lib/use-cases/readiness/remind-managers';
import { exportRoster } from '@/lib/use-cases/rosters/export-roster';
import { freezeRoster } from '@/lib/use-cases/rosters/freeze-roster';
import { getRoster, getRosterNews } from '@/lib/use-cases/rosters/get-roster';
import { importRoster } from '@/lib/use-cases/rosters/import-roster';
import { listMappings } from '@/lib/use-cases/rosters/list-mappings';
import { readRosterFile } from '@/lib/use-cases/rosters/read-roster-file';
import { reopenRoster } from '@/lib/use-cases/rosters/reopen-roster';
import { returnRoster } from '@/lib/use-cases/rosters/return-roster';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import { signOffRoster } from '@/lib/use-cases/rosters/sign-off-roster';
import { submitRoster } from '@/lib/use-cases/rosters/submit-roster';
import { withdrawRoster } from '@/lib/use-cases/rosters/withdraw-roster';
import { discardDraft } from '@/lib/use-cases/rule-sets/discard-draft';
import { getRuleSet } from '@/lib/use-cases/rule-sets/get-rule-set';
import { putInForce } from '@/lib/use-cases/rule-sets/put-in-force';
import { saveDraft } from '@/lib/use-cases/rule-sets/save-draft';
import { changeSeason } from '@/lib/use-cases/seasons/change-season';
import { chooseCurrentSeason } from '@/lib/use-cases/seasons/choose-current-season';
import { getSeason } from '@/lib/use-cases/seasons/get-season';
import { addTeam } from '@/lib/use-cases/teams/add-team';
import { changeTeam } from '@/lib/use-cases/teams/change-team';
import { exportTeams } from '@/lib/use-cases/teams/export-teams';
import { importTeams } from '@/lib/use-cases/teams/import-teams';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { removeTeam } from '@/lib/use-cases/teams/remove-team';
import { exportHistory } from '@/lib/use-cases/history/export-history';
import { listEvents } from '@/lib/use-cases/history/list-events';
import { changeLeagueSettings } from '@/lib/use-cases/leagues/change-league-settings';
import { getLeagueSettings } from '@/lib/use-cases/leagues/get-league-settings';
import { listPeople } from '@/lib/use-cases/people/list-people';
import { listRuleSets } from '@/lib/use-cases/rule-sets/list-rule-sets';
import { startRuleSet } from '@/lib/use-cases/rule-sets/start-rule-set';
import { listSeasons } from '@/lib/use-cases/seasons/list-seasons';
import { openSeason } from '@/lib/use-cases/seasons/open-season';
import { readTeamFile } from '@/lib/use-cases/teams/read-team-file';
import { buildWorld, someGarments, someKit, someRules, type FurnishedLeague } from '../factories/league';
import { makeAdd } from '../factories/rosters';
import { queryAsAdmin } from '../support/database';

// One league attacks the other with everything it could have guessed: every id and every address of it.

let mine: FurnishedLeague;
let theirs: FurnishedLeague;
/** Of the attacked league: a held batch and a released one with its bundle, and an invitation. */
let batch: { held: string; heldId: string; released: string; releasedId: string };
let invitationId: string;
let draftRuleSetId: string;

const kits = { home: someKit, away: null };
const seasonFields = {
  name: 'Taken over',
  sport: 'chess',
  rosterOpensOn: '2027-02-15',
  freezesAt: '2027-03-12T18:00',
  releaseOn: null,
  handOutOn: '2027-04-10',
  firstMatchOn: '2027-04-17',
};
const divisionFields = () => ({
  name: 'Taken over',
  ageBand: '',
  level: '',
  ruleSetId: theirs.ruleSet.id,
  leastPlayers: 1,
  mostPlayers: 9,
  freezesAt: null,
  garments: someGarments,
});

type Attack = (ctx: ActorContext) => Promise<unknown>;

/** The season of whoever attacks: what they add goes in there, so that only the other things they name are strange. */
const homeSeason = (ctx: ActorContext): string => ctx.league.currentSeason?.slug ?? '';

/** Every use case that is given the id or the address of a thing, aimed at the other league's. By file. */
const attacks: Record<string, Attack | Attack[]> = {
  'batches/change-batch': (ctx) =>
    changeBatch(ctx, {
      batchId: batch.heldId,
      rowVersion: 1,
      teamIds: [theirs.teams[1].id],
      shopId: theirs.shop.id,
      promisedOn: null,
    }),
  'batches/discard-batch': (ctx) => discardBatch(ctx, { batchId: batch.heldId }),
  'batches/get-batch': [
    (ctx) => getBatch(ctx, { code: batch.released }),
    (ctx) => getBundleState(ctx, { code: batch.released }),
  ],
  'batches/hold-batch': (ctx) =>
    holdBatch(ctx, {
      season: homeSeason(ctx),
      teamIds: [theirs.teams[1].id],
      shopId: theirs.shop.id,
      promisedOn: null,
    }),
  'batches/list-batches': [
    (ctx) => listBatches(ctx, { season: theirs.season.slug }),
    (ctx) => getBatchOptions(ctx, { season: theirs.season.slug, batchId: batch.heldId }),
  ],
  'batches/mark-batch': (ctx) =>
    markBatch(ctx, { batchId: batch.releasedId, from: 'released', to: 'on press', note: '' }),
  'batches/open-bundle-file': (ctx) =>
    openBundleFile(ctx, { code: batch.released, path: null, isFirstRange: true }),
  'batches/rebuild-bundle': (ctx) => rebuildBundle(ctx, { batchId: batch.releasedId }),
  'batches/release-batch': (ctx) => releaseBatch(ctx, { batchId: batch.heldId }),
  'divisions/add-division': (ctx) => addDivision(ctx, { season: homeSeason(ctx), fields: divisionFields() }),
  'divisions/change-division': (ctx) =>
    changeDivision(ctx, { divisionId: theirs.division.id, rowVersion: 1, fields: divisionFields() }),
  'divisions/list-divisions': [
    (ctx) => listDivisions(ctx, { season: theirs.season.slug }),
    (ctx) => getDivisionForm(ctx, { season: homeSeason(ctx), division: theirs.division.slug }),
  ],
  'divisions/remove-division': (ctx) => removeDivision(ctx, { divisionId: theirs.division.id }),
  'match/check-match': (ctx) =>
    checkMatch(ctx, {
      season: theirs.season.slug,
      division: theirs.division.slug,
      home: theirs.teams[0].slug,
      away: theirs.teams[1].slug,
    }),
  'people/change-manager-teams': (ctx) =>
    changeManagerTeams(ctx, { membershipId: theirs.members.manager.id, teamIds: [theirs.teams[1].id] }),
  'people/end-role': (ctx) => endRole(ctx, { membershipId: theirs.members.admin.id }),
  'people/invite-person': (ctx) =>
    invitePerson(ctx, {
      email: 'intruder@outside.example',
      role: 'team manager',
      teamIds: [theirs.teams[0].id],
      shop: null,
    } as never),
  'people/resend-invitation': (ctx) => resendInvitation(ctx, { invitationId }),
  'people/revoke-invitation': (ctx) => revokeInvitation(ctx, { invitationId }),
  'readiness/export-readiness': (ctx) => exportReadiness(ctx, { season: theirs.season.slug }),
  'readiness/list-readiness': (ctx) => listReadiness(ctx, { season: theirs.season.slug }),
  'readiness/remind-managers': (ctx) =>
    remindManagers(ctx, { season: homeSeason(ctx), teamIds: [theirs.teams[0].id] }),
  'rosters/export-roster': (ctx) => exportRoster(ctx, { rosterId: theirs.teams[0].rosterId }),
  'rosters/freeze-roster': (ctx) => freezeRoster(ctx, { rosterId: theirs.teams[1].rosterId, revision: 1 }),
  'rosters/get-roster': [
    (ctx) => getRoster(ctx, { season: theirs.season.slug, team: theirs.teams[0].slug }),
    (ctx) => getRosterNews(ctx, { rosterId: theirs.teams[0].rosterId, since: 0, state: undefined }),
  ],
  'rosters/import-roster': (ctx) =>
    importRoster(ctx, {
      rosterId: theirs.teams[0].rosterId,
      revision: 1,
      mode: 'replace',
      lines: [{ line: { name: 'Intruder', nameOnBack: '', number: '66', role: '', sizes: {} }, extra: {} }],
      decisions: [],
      refused: 0,
      remember: null,
    }),
  'rosters/list-mappings': (ctx) => listMappings(ctx, { rosterId: theirs.teams[0].rosterId }),
  'rosters/read-roster-file': (ctx) =>
    readRosterFile(ctx, {
      rosterId: theirs.teams[0].rosterId,
      name: 'a.csv',
      bytes: new TextEncoder().encode('Name\nA'),
    }),
  'rosters/reopen-roster': (ctx) =>
    reopenRoster(ctx, { rosterId: theirs.teams[1].rosterId, revision: 1, reason: 'mine now' }),
  'rosters/return-roster': (ctx) =>
    returnRoster(ctx, { rosterId: theirs.teams[1].rosterId, revision: 1, reason: 'mine now' }),
  'rosters/save-roster-edits': (ctx) =>
    saveRosterEdits(ctx, {
      rosterId: theirs.teams[0].rosterId,
      baseRevision: 1,
      edits: [
        {
          kind: 'add',
          after: null,
          player: {
            id: crypto.randomUUID(),
            name: 'Intruder',
            nameOnBack: '',
            number: '66',
            role: '',
            sizes: {},
            extra: {},
          },
        },
      ],
    }),
  'rosters/sign-off-roster': (ctx) => signOffRoster(ctx, { rosterId: theirs.teams[0].rosterId, revision: 1 }),
  'rosters/submit-roster': (ctx) => submitRoster(ctx, { rosterId: theirs.teams[0].rosterId, revision: 1 }),
  'rosters/withdraw-roster': (ctx) =>
    withdrawRoster(ctx, { rosterId: theirs.teams[0].rosterId, revision: 1 }),
  'rule-sets/discard-draft': (ctx) => discardDraft(ctx, { ruleSetId: draftRuleSetId }),
  'rule-sets/get-rule-set': (ctx) => getRuleSet(ctx, { ruleSetId: theirs.ruleSet.id }),
  'rule-sets/put-in-force': (ctx) => putInForce(ctx, { ruleSetId: draftRuleSetId, rowVersion: 1 }),
  'rule-sets/save-draft': (ctx) =>
    saveDraft(ctx, { ruleSetId: theirs.ruleSet.id, rowVersion: null, ruleSet: someRules }),
  'seasons/change-season': (ctx) =>
    changeSeason(ctx, { seasonId: theirs.season.id, rowVersion: 1, fields: seasonFields }),
  'seasons/choose-current-season': (ctx) => chooseCurrentSeason(ctx, { seasonId: theirs.season.id }),
  'seasons/get-season': (ctx) => getSeason(ctx, { season: theirs.season.slug }),
  'teams/add-team': (ctx) =>
    addTeam(ctx, {
      season: homeSeason(ctx),
      fields: { name: 'Intruders', divisionId: theirs.division.id, kits },
    }),
  'teams/change-team': (ctx) =>
    changeTeam(ctx, {
      teamId: theirs.teams[0].id,
      rowVersion: 1,
      fields: { name: 'Intruders', divisionId: theirs.division.id, kits },
    }),
  'teams/export-teams': (ctx) => exportTeams(ctx, { season: theirs.season.slug }),
  'teams/import-teams': (ctx) =>
    importTeams(ctx, {
      season: homeSeason(ctx),
      teams: [{ name: 'Intruders', divisionId: theirs.division.id, home: someKit, away: null }],
      refused: 0,
    }),
  'teams/list-teams': (ctx) => listTeams(ctx, { season: theirs.season.slug }),
  'teams/remove-team': (ctx) => removeTeam(ctx, { teamId: theirs.teams[0].id }),
};

/** Files that need no attack, each with the reason. */
const harmless: Record<string, string> = {
  'batches/build-bundle': 'only a worker calls it, with ids from a job',
  'batches/list-shop-batches': 'takes nothing; attacked by itself below',
  'history/export-history': 'takes no id; reads the own league',
  'history/list-events': 'takes no id; reads the own league',
  'leagues/change-league-settings': 'takes no id; changes the own league',
  'leagues/create-league': 'makes a league of its own',
  'leagues/get-league-settings': 'takes no id; reads the own league',
  'people/accept-invitation': 'opened by the secret of a link',
  'people/find-invitation': 'opened by the secret of a link',
  'people/join-as-newcomer': 'opened by the secret of a link',
  'people/list-people': 'takes no id; reads the own league',
  'public/read-public-workbook': 'touches no league',
  'rosters/freeze-due-rosters': 'only a worker calls it, with ids from a job',
  'rule-sets/list-rule-sets': 'takes no id; reads the own league',
  'rule-sets/start-rule-set': 'takes no id; makes one of its own',
  'seasons/list-season-links': 'takes no id; reads the own league',
  'seasons/list-seasons': 'takes no id; reads the own league',
  'seasons/open-season': 'takes no id; makes one of its own',
  'teams/read-team-file': 'touches no league',
};

/** The permission each attack stands before, in the order of its attacks: whoever lacks it is refused at home too. Null: open to everyone of the league. */
const guards: Record<string, Permission | Permission[] | null> = {
  'batches/change-batch': 'batch.make',
  'batches/discard-batch': 'batch.make',
  'batches/get-batch': 'batch.read',
  'batches/hold-batch': 'batch.make',
  'batches/list-batches': 'batch.make',
  'batches/mark-batch': 'batch.mark',
  'batches/open-bundle-file': 'batch.read',
  'batches/rebuild-bundle': 'batch.read',
  'batches/release-batch': 'batch.make',
  'divisions/add-division': 'division.write',
  'divisions/change-division': 'division.write',
  'divisions/list-divisions': ['division.read', 'division.write'],
  'divisions/remove-division': 'division.write',
  'match/check-match': 'match.check',
  'people/change-manager-teams': 'people.manage',
  'people/end-role': 'people.manage',
  'people/invite-person': 'people.manage',
  'people/resend-invitation': 'people.manage',
  'people/revoke-invitation': 'people.manage',
  'readiness/export-readiness': 'readiness.read',
  'readiness/list-readiness': 'readiness.read',
  'readiness/remind-managers': 'readiness.remind',
  'rosters/export-roster': 'roster.read',
  'rosters/freeze-roster': 'roster.sign-off',
  'rosters/get-roster': 'roster.read',
  'rosters/import-roster': 'roster.edit',
  'rosters/list-mappings': 'roster.edit',
  'rosters/read-roster-file': 'roster.edit',
  'rosters/reopen-roster': 'roster.sign-off',
  'rosters/return-roster': 'roster.return',
  'rosters/save-roster-edits': 'roster.edit',
  'rosters/sign-off-roster': 'roster.sign-off',
  'rosters/submit-roster': 'roster.submit',
  'rosters/withdraw-roster': 'roster.submit',
  'rule-sets/discard-draft': 'rule-set.write',
  'rule-sets/get-rule-set': 'rule-set.read',
  'rule-sets/put-in-force': 'rule-set.write',
  'rule-sets/save-draft': 'rule-set.write',
  'seasons/change-season': 'season.write',
  'seasons/choose-current-season': 'season.write',
  'seasons/get-season': null,
  'teams/add-team': 'team.write',
  'teams/change-team': 'team.write',
  'teams/export-teams': 'team.read',
  'teams/import-teams': 'team.write',
  'teams/list-teams': 'team.read',
  'teams/remove-team': 'team.write',
};

const noFilter = { person: null, kind: null, from: null, to: null, before: null } as never;

/** What takes no id and so can't be aimed at another league, with the permission it stands before. */
const guarded: Record<string, { permission: Permission; attempt: Attack }> = {
  'history/export-history': {
    permission: 'history.read',
    attempt: async (ctx) => exportHistory(ctx, noFilter),
  },
  'history/list-events': { permission: 'history.read', attempt: (ctx) => listEvents(ctx, noFilter) },
  'leagues/change-league-settings': {
    permission: 'league.settings',
    attempt: (ctx) => changeLeagueSettings(ctx, {} as never),
  },
  'leagues/get-league-settings': { permission: 'league.settings', attempt: getLeagueSettings },
  'people/list-people': { permission: 'people.read', attempt: listPeople },
  'rule-sets/list-rule-sets': { permission: 'rule-set.read', attempt: listRuleSets },
  'rule-sets/start-rule-set': {
    permission: 'rule-set.write',
    attempt: (ctx) => startRuleSet(ctx, { name: 'Mine', sport: 'chess', presetId: null }),
  },
  'seasons/list-seasons': { permission: 'season.write', attempt: listSeasons },
  'seasons/open-season': { permission: 'season.write', attempt: (ctx) => openSeason(ctx, {} as never) },
  'teams/read-team-file': {
    permission: 'team.write',
    attempt: (ctx) => readTeamFile(ctx, { name: 'a.csv', bytes: new TextEncoder().encode('Team') }),
  },
};

/** Everything stored of a league, as one hash per table. */
async function fingerprint(leagueId: string): Promise<Record<string, string>> {
  const tables = await queryAsAdmin<{ name: string }>(
    `select table_name as name from information_schema.columns where table_schema = 'public' and column_name = 'league_id' order by 1`,
  );
  const result: Record<string, string> = {};
  for (const { name } of tables) {
    const [row] = await queryAsAdmin<{ hash: string | null }>(
      `select md5(string_agg(t::text, '|' order by t::text)) as hash from ${name} t where league_id = '${leagueId}'`,
    );
    result[name] = row?.hash ?? 'empty';
  }
  return result;
}

beforeAll(async () => {
  [mine, theirs] = await buildWorld({ leagues: 2 });
  const released = await holdBatch(theirs.admin, {
    season: theirs.season.slug,
    teamIds: [theirs.teams[1].id],
    shopId: theirs.shop.id,
    promisedOn: null,
  });
  const { batch: first } = await getBatch(theirs.admin, released);
  await releaseBatch(theirs.admin, { batchId: first.id });
  await buildBundle(theirs.admin, { leagueId: theirs.league.id, batchId: first.id });
  await submitRoster(theirs.manager, { rosterId: theirs.teams[0].rosterId, revision: 1 });
  await signOffRoster(theirs.admin, {
    rosterId: theirs.teams[0].rosterId,
    revision: await revisionOf(theirs.teams[0].rosterId),
  });
  const held = await holdBatch(theirs.admin, {
    season: theirs.season.slug,
    teamIds: [theirs.teams[0].id],
    shopId: theirs.shop.id,
    promisedOn: null,
  });
  const { batch: second } = await getBatch(theirs.admin, held);
  batch = { held: held.code, heldId: second.id, released: released.code, releasedId: first.id };
  await saveDraft(theirs.admin, {
    ruleSetId: theirs.ruleSet.id,
    rowVersion: null,
    ruleSet: theirs.ruleSet.rules,
  });
  draftRuleSetId = theirs.ruleSet.id;
  await invitePerson(theirs.admin, {
    email: 'guest@theirs.example',
    role: 'referee',
    teamIds: [],
    shop: null,
  } as never);
  const [row] = await queryAsAdmin<{ id: string }>(
    `select id from invitations where league_id = '${theirs.league.id}'`,
  );
  invitationId = row?.id ?? '';
});

async function revisionOf(rosterId: string): Promise<number> {
  const [row] = await queryAsAdmin<{ revision: number }>(
    `select revision from rosters where id = '${rosterId}'`,
  );
  return row?.revision ?? 0;
}

const isRefusal = (error: unknown): boolean =>
  error instanceof AppError && (error.code === 'not-found' || error.code === 'forbidden');
/** A list of teams to remind is answered as a whole; strange ones in it are left out like teams that do not exist. */
const isNobodyReminded = (error: unknown): boolean =>
  error instanceof AppError && error.message.startsWith('Nobody was written to');
/** Nothing at all is no news; anything else, even without a known secret in it, was not to be had. */
const isTelling = (value: unknown, secrets: readonly string[]): boolean =>
  secrets.some((secret) => JSON.stringify(value).includes(secret)) ||
  !(Array.isArray(value) && value.length === 0);

describe('two leagues', () => {
  it('leave no use case out of this attack', () => {
    const files = readdirSync('lib/use-cases', { recursive: true, encoding: 'utf8' })
      .map((file) => file.replace(/\.ts$/, ''))
      .filter(
        (file) => file.includes('/') && !file.endsWith('-schemas') && !/^(account|health|mail)\//.test(file),
      );
    expect(files.filter((file) => !(file in attacks) && !(file in harmless))).toEqual([]);
  });

  it('are closed to each other: whoever tries, with any id of the other league, gets nothing and changes nothing', async () => {
    const before = await fingerprint(theirs.league.id);
    const secrets = [
      theirs.league.id,
      theirs.season.id,
      theirs.division.id,
      theirs.ruleSet.id,
      batch.heldId,
      ...theirs.teams.map((team) => team.id),
    ];
    const leaks: string[] = [];
    for (const role of ['admin', 'manager', 'referee', 'decorator'] as const) {
      for (const [file, given] of Object.entries(attacks)) {
        for (const attack of [given].flat()) {
          const outcome = await attack(mine[role]).then(
            (value) => ({ value }),
            (error: unknown) => ({ error }),
          );
          if ('error' in outcome) {
            if (!isRefusal(outcome.error) && !isNobodyReminded(outcome.error))
              leaks.push(`${role} ${file}: not refused but ${String(outcome.error)}`);
          } else if (isTelling(outcome.value, secrets)) {
            leaks.push(`${role} ${file}: ${JSON.stringify(outcome.value).slice(0, 200)}`);
          }
        }
      }
    }
    expect(leaks).toEqual([]);
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('answer for things of the other league exactly as for things that do not exist', async () => {
    const [wrongId] = [crypto.randomUUID()];
    const real = await removeTeam(mine.admin, { teamId: theirs.teams[2].id }).catch(
      (error: unknown) => error,
    );
    const none = await removeTeam(mine.admin, { teamId: wrongId }).catch((error: unknown) => error);
    expect(real).toBeInstanceOf(AppError);
    expect([(real as AppError).code, (real as AppError).message]).toEqual([
      (none as AppError).code,
      (none as AppError).message,
    ]);
  });

  it('show a decorator of both only released batches, and nothing once the membership has ended', async () => {
    const codes = async () =>
      (await listShopBatches({ ...theirs.decorator, userId: theirs.members.decorator.person.id })).map(
        (entry) => entry.code,
      );
    expect(await codes()).toEqual([batch.released]);
    await endRole(theirs.admin, { membershipId: theirs.members.decorator.id });
    expect(await codes()).toEqual([]);
  });
});

describe('within one league', () => {
  it('every role is refused what its row of the table of permissions does not grant, and changes nothing', async () => {
    const roleOf = {
      admin: 'league admin',
      manager: 'team manager',
      referee: 'referee',
      decorator: 'decorator',
    } as const satisfies Record<string, Role>;
    const doors = [
      ...Object.entries(attacks).flatMap(([file, given]) =>
        [given].flat().map((attempt, i) => {
          const guard = guards[file];
          return { file, attempt, permission: Array.isArray(guard) ? guard[i] : guard };
        }),
      ),
      ...Object.entries(guarded).map(([file, door]) => ({ file, ...door })),
    ];
    const before = await fingerprint(theirs.league.id);
    const through: string[] = [];
    let tried = 0;
    for (const { file, attempt, permission } of doors) {
      expect([file, permission]).not.toEqual([file, undefined]);
      if (!permission) continue;
      for (const [person, role] of Object.entries(roleOf) as [keyof typeof roleOf, Role][]) {
        if (permissionTable[permission].reach[role] !== 'none') continue;
        tried += 1;
        const outcome = await attempt(theirs[person]).then(
          () => 'done',
          (error: unknown) => (isRefusal(error) ? 'refused' : String(error)),
        );
        if (outcome !== 'refused') through.push(`${role} ${file}: ${outcome}`);
      }
    }
    expect(through).toEqual([]);
    expect(tried).toBeGreaterThan(120);
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('a manager is refused the rosters of every team but their own', async () => {
    const stranger = {
      ...theirs.manager,
      actor: { ...theirs.manager.actor, teamIds: [theirs.teams[2].id] },
    };
    const before = await fingerprint(theirs.league.id);
    const through: string[] = [];
    for (const [file, given] of Object.entries(attacks).filter(([name]) => name.startsWith('rosters/'))) {
      for (const attack of [given].flat()) {
        const outcome = await attack(stranger).then(
          () => 'done',
          (error: unknown) => (isRefusal(error) ? 'refused' : String(error)),
        );
        if (outcome !== 'refused') through.push(`${file}: ${outcome}`);
      }
    }
    expect(through).toEqual([]);
    const own = await Promise.all([
      listTeams(stranger, { season: theirs.season.slug }),
      listReadiness(stranger, { season: theirs.season.slug }),
    ]);
    expect(own.map(({ teams }) => teams.map((team) => team.id))).toEqual([
      [theirs.teams[2].id],
      [theirs.teams[2].id],
    ]);
    expect(await fingerprint(theirs.league.id)).toEqual(before);
  });

  it('nobody but those the table of permissions names gets through a door', async () => {
    const closed: [string, ActorContext, () => Promise<unknown>][] = [
      [
        'referee reads a roster',
        theirs.referee,
        () => getRoster(theirs.referee, { season: theirs.season.slug, team: theirs.teams[0].slug }),
      ],
      [
        'decorator reads a roster',
        theirs.decorator,
        () => getRoster(theirs.decorator, { season: theirs.season.slug, team: theirs.teams[0].slug }),
      ],
      [
        'manager reads another team',
        theirs.manager,
        () => getRoster(theirs.manager, { season: theirs.season.slug, team: theirs.teams[1].slug }),
      ],
      [
        'manager signs off',
        theirs.manager,
        () => signOffRoster(theirs.manager, { rosterId: theirs.teams[0].rosterId, revision: 1 }),
      ],
      [
        'manager holds a batch',
        theirs.manager,
        () =>
          holdBatch(theirs.manager, {
            season: theirs.season.slug,
            teamIds: [theirs.teams[0].id],
            shopId: theirs.shop.id,
            promisedOn: null,
          }),
      ],
      [
        'decorator reads a held batch',
        theirs.decorator,
        () => getBatch(theirs.decorator, { code: batch.held }),
      ],
      [
        'admin marks for the shop',
        theirs.admin,
        () =>
          markBatch(theirs.admin, { batchId: batch.releasedId, from: 'released', to: 'on press', note: '' }),
      ],
      [
        'referee removes a team',
        theirs.referee,
        () => removeTeam(theirs.referee, { teamId: theirs.teams[2].id }),
      ],
    ];
    for (const [what, , attempt] of closed) {
      const outcome = await attempt().then(
        () => 'done',
        (error: unknown) => (error instanceof AppError ? error.code : error),
      );
      expect([what, outcome]).toEqual([what, expect.stringMatching(/^(not-found|forbidden)$/)]);
    }
  });

  it('the right people do get through: the guards are no wall', async () => {
    await expect(listTeams(mine.admin, { season: mine.season.slug })).resolves.toMatchObject({
      teams: { length: 3 },
    });
    await expect(
      getRoster(mine.manager, { season: mine.season.slug, team: mine.teams[0].slug }),
    ).resolves.toMatchObject({ players: { length: 2 } });
    const { rosterId } = mine.teams[0];
    await saveRosterEdits(mine.manager, {
      rosterId,
      baseRevision: 1,
      edits: [makeAdd({ name: 'Calloway, Ines', number: '14', sizes: { jersey: 'YM' } }, null)],
    });
    await submitRoster(mine.manager, { rosterId, revision: await revisionOf(rosterId) });
    await signOffRoster(mine.admin, { rosterId, revision: await revisionOf(rosterId) });
    const { code } = await holdBatch(mine.admin, {
      season: mine.season.slug,
      teamIds: [mine.teams[0].id, mine.teams[1].id],
      shopId: mine.shop.id,
      promisedOn: null,
    });
    const { batch: held } = await getBatch(mine.admin, { code });
    await releaseBatch(mine.admin, { batchId: held.id });
    await expect(
      markBatch(mine.decorator, { batchId: held.id, from: 'released', to: 'on press', note: '' }),
    ).resolves.toMatchObject({ state: 'on press' });
    const check = await checkMatch(mine.referee, {
      season: mine.season.slug,
      division: mine.division.slug,
      home: mine.teams[0].slug,
      away: mine.teams[1].slug,
    });
    expect(check.match?.home.players).toHaveLength(3);
  });
});
