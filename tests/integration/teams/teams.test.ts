import { beforeAll, describe, expect, it } from 'vitest';
import { planTeams } from '@/app/[league]/[season]/teams/import/_components/plan-teams';
import { parseTable } from '@/lib/domain/roster/import/parse-table';
import { readTeams } from '@/lib/domain/roster/import/read-teams';
import { guessTeamMapping } from '@/lib/domain/roster/import/team-mapping';
import { addTeam } from '@/lib/use-cases/teams/add-team';
import { changeTeam } from '@/lib/use-cases/teams/change-team';
import { exportTeams } from '@/lib/use-cases/teams/export-teams';
import { importTeams } from '@/lib/use-cases/teams/import-teams';
import { listTeams } from '@/lib/use-cases/teams/list-teams';
import { removeTeam } from '@/lib/use-cases/teams/remove-team';
import {
  buildDivision,
  buildTeam,
  buildWorld,
  moveRoster,
  someKit,
  type FurnishedLeague,
} from '../../factories/league';
import { codeOf } from '../../support/outcomes';
import { whileTeamIsAdded } from '../../support/slow-writer';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { queryAsAdmin } from '../../support/database';

let world: FurnishedLeague;
let other: FurnishedLeague;
beforeAll(async () => {
  [world, other] = await buildWorld({ leagues: 2 });
});

const kits = { home: someKit, away: null };
const red = { ...someKit, name: 'red', body: '#b01f24', sleeves: '#b01f24' };
const add = (name: string, divisionId = world.division.id) =>
  addTeam(world.admin, { season: world.season.slug, fields: { name, divisionId, kits } });
const place = () => ({
  leagueId: world.league.id,
  seasonId: world.season.id,
  divisionId: world.division.id,
});
const find = async (slug: string) => {
  const { teams } = await listTeams(world.admin, { season: world.season.slug });
  const team = teams.find((entry) => entry.slug === slug);
  if (!team) throw new Error(`no team ${slug}`);
  return team;
};

describe('adding a team', () => {
  it('opens an empty roster with it', async () => {
    const { slug } = await add('Otters');
    expect(await find(slug)).toMatchObject({ state: 'open', players: 0, managers: 0, kits });
  });

  it('gives teams of one season addresses of their own, over all divisions', async () => {
    const second = await buildDivision(world.league, world.season);
    expect(await add('Bank Voles')).toEqual({ slug: 'bank-voles' });
    expect(await add('Bank Voles', second.id)).toEqual({ slug: 'bank-voles-2' });
    expect(await add('Import')).toEqual({ slug: 'import-2' });
  });

  it('refuses a second team of the name in one division, whatever the case and however close', async () => {
    await add('Herons');
    await expect(add('HERONS')).rejects.toMatchObject({
      code: 'conflict',
      fields: { 'fields.name': expect.stringContaining('HERONS') },
    });
  });

  it('waits for whoever is adding the same team, and is then refused', async () => {
    const outcome = await whileTeamIsAdded(place(), { name: 'Egrets', slug: 'egrets' }, () => add('Egrets'));
    expect(codeOf(outcome)).toBe('conflict');
  });

  it('takes only divisions of the season', async () => {
    await expect(add('Strays', other.division.id)).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('changing a team', () => {
  it('keeps what changed with both values, and turns a stale writer away', async () => {
    const { slug } = await add('Voles');
    const { id: teamId, rowVersion } = await find(slug);
    const change = (name: string) =>
      changeTeam(world.admin, { teamId, rowVersion, fields: { name, divisionId: world.division.id, kits } });
    await change('Water Voles');
    await expect(change('Field Voles')).rejects.toMatchObject({ code: 'conflict' });
    expect((await find(slug)).name).toBe('Water Voles');
    const [event] = await queryAsAdmin(
      `select data from audit_events where subject_id = $1 and type = 'team changed'`,
      [teamId],
    );
    expect(event).toEqual({
      data: { name: 'Water Voles', changes: { name: { from: 'Voles', to: 'Water Voles' } } },
    });
  });

  it('keeps a signed-off team in its division, and lets its colours change', async () => {
    const second = await buildDivision(world.league, world.season);
    const { id: teamId, rowVersion, name } = await find(world.teams[1].slug);
    await expect(
      changeTeam(world.admin, { teamId, rowVersion, fields: { name, divisionId: second.id, kits } }),
    ).rejects.toMatchObject({ code: 'locked' });
    await changeTeam(world.admin, {
      teamId,
      rowVersion,
      fields: { name, divisionId: world.division.id, kits: { home: red, away: null } },
    });
    expect((await find(world.teams[1].slug)).kits.home.name).toBe('red');
  });

  it('ends as one of the two when two teams are given one name at the same moment', async () => {
    const made = [await find((await add('Left')).slug), await find((await add('Right')).slug)];
    const outcomes = await Promise.allSettled(
      made.map(({ id: teamId, rowVersion }) =>
        changeTeam(world.admin, {
          teamId,
          rowVersion,
          fields: { name: 'Middle', divisionId: world.division.id, kits },
        }),
      ),
    );
    const refused = outcomes.filter((one) => one.status === 'rejected');
    expect(refused.map((one) => (one.reason as { code?: string }).code)).toEqual(['conflict']);
  });
});

describe('removing a team', () => {
  it('says how many players were lost and keeps that in the history', async () => {
    const team = await buildTeam(world.league, world.division, { name: 'Gone', players: [{}, {}, {}] });
    expect(await removeTeam(world.admin, { teamId: team.id })).toEqual({ name: 'Gone', players: 3 });
    expect(await queryAsAdmin('select 1 from players where roster_id = $1', [team.rosterId])).toEqual([]);
    const [event] = await queryAsAdmin('select type, data from audit_events where subject_id = $1', [
      team.id,
    ]);
    expect(event).toEqual({ type: 'team removed', data: { name: 'Gone', players: 3 } });
  });

  it('is blocked while a batch holds its roster, with the batch’s code', async () => {
    const team = await buildTeam(world.league, world.division, {
      name: 'Held',
      players: [{}],
      state: 'signed off',
    });
    const { code } = await holdBatch(world.admin, {
      season: world.season.slug,
      teamIds: [team.id],
      shopId: world.shop.id,
      promisedOn: null,
    });
    await expect(removeTeam(world.admin, { teamId: team.id })).rejects.toMatchObject({
      code: 'conflict',
      message: `Batch ${code} holds the roster of Held, so the team stays.`,
    });
    expect(await queryAsAdmin('select 1 from players where roster_id = $1', [team.rosterId])).toHaveLength(1);
  });

  it('is blocked while its roster is signed off or frozen', async () => {
    for (const state of ['signed off', 'frozen'] as const) {
      const team = await buildTeam(world.league, world.division, { players: [{}] });
      await moveRoster(world.league, team.rosterId, state);
      await expect(removeTeam(world.admin, { teamId: team.id })).rejects.toMatchObject({ code: 'locked' });
    }
  });
});

describe('importing teams', () => {
  const line = (name: string, divisionId: string, home = red) => ({ name, divisionId, home, away: null });

  it('adds, changes and leaves every team of the list exactly once, and tells the history so', async () => {
    const division = await buildDivision(world.league, world.season);
    await buildTeam(world.league, division, { name: 'Same', kits: { home: red, away: null }, players: [{}] });
    const changed = await buildTeam(world.league, division, { name: 'Changed', players: [{}, {}] });
    await buildTeam(world.league, division, { name: 'Untouched' });
    const counts = await importTeams(world.admin, {
      season: world.season.slug,
      teams: ['Same', 'CHANGED', 'New one', 'New two'].map((name) => line(name, division.id)),
      refused: 3,
    });
    expect(counts).toEqual({ added: 2, changed: 1, unchanged: 1 });
    const { teams } = await listTeams(world.admin, { season: world.season.slug });
    const own = teams.filter((team) => team.divisionId === division.id);
    expect(own.map(({ name, players, kits: { home } }) => [name, players, home.name])).toEqual([
      ['Changed', 2, 'red'],
      ['New one', 0, 'red'],
      ['New two', 0, 'red'],
      ['Same', 1, 'red'],
      ['Untouched', 0, 'navy'],
    ]);
    expect(own.find((team) => team.id === changed.id)?.state).toBe('open');
    const [event] = await queryAsAdmin(
      `select data from audit_events where subject_id = $1 and type = 'teams imported'`,
      [world.season.id],
    );
    expect(event).toEqual({ data: { added: 2, changed: 1, refused: 3 } });
  });

  it('brings in nothing at all when one line cannot be', async () => {
    const division = await buildDivision(world.league, world.season);
    const before = (await listTeams(world.admin, { season: world.season.slug })).teams.length;
    const attempt = (...names: [string, string][]) =>
      importTeams(world.admin, {
        season: world.season.slug,
        teams: names.map(([name, divisionId]) => line(name, divisionId)),
        refused: 0,
      });
    await expect(
      attempt(['Fine', division.id], ['Twin', division.id], ['twin', division.id]),
    ).rejects.toMatchObject({ code: 'invalid' });
    await expect(attempt(['Fine', division.id], ['Stray', other.division.id])).rejects.toMatchObject({
      code: 'not-found',
    });
    expect((await listTeams(world.admin, { season: world.season.slug })).teams).toHaveLength(before);
  });

  it('waits for whoever is adding one of its teams, and then changes that one', async () => {
    const division = await buildDivision(world.league, world.season);
    const outcome = await whileTeamIsAdded(
      { ...place(), divisionId: division.id },
      { name: 'Twice', slug: 'twice' },
      () =>
        importTeams(world.admin, {
          season: world.season.slug,
          teams: [line('Twice', division.id), line('Other', division.id)],
          refused: 0,
        }),
    );
    expect(outcome).toEqual({ status: 'fulfilled', value: { added: 1, changed: 1, unchanged: 0 } });
  });
});

describe('a list of teams', () => {
  const plan = async (csv: string) => {
    const { teams, divisions } = await listTeams(world.admin, { season: world.season.slug });
    const parsed = parseTable(csv);
    if (!parsed.ok) throw new Error(parsed.message);
    const reading = readTeams(parsed.table.rows, guessTeamMapping(parsed.table.rows), divisions);
    return { planned: planTeams(reading.lines, teams), refused: reading.refused, teams };
  };

  it('that was exported changes no team when it comes in again', async () => {
    const division = await buildDivision(world.league, world.season, { name: 'Ü10; "Mixed", A' });
    await buildTeam(world.league, division, { name: '=Sum, the "Owls"', kits: { home: red, away: someKit } });
    await buildTeam(world.league, division, {
      name: 'O’Neill’s 鷺',
      kits: { home: { ...red, number: '#ffd700', sleeves: '#000000', outline: '#000000' }, away: null },
    });
    const { csv } = await exportTeams(world.admin, { season: world.season.slug });
    const { planned, refused, teams } = await plan(csv);
    expect(refused).toEqual([]);
    expect(planned).toHaveLength(teams.length);
    expect(new Set(planned.map((team) => team.fate))).toEqual(new Set(['unchanged']));
  });

  it('that names no colour for the numbers leaves theirs as it is', async () => {
    const division = await buildDivision(world.league, world.season, { name: 'Numbered' });
    const gold = { ...someKit, number: '#ffd700' };
    await buildTeam(world.league, division, { name: 'Gilded', kits: { home: gold, away: null } });
    const csv =
      'Team,Division,Home colour\nGilded,Numbered,navy (#14375e)\nGilded,numbered,red\nPlain,Numbered,#b01f24\n';
    const { planned, refused } = await plan(csv);
    expect(planned.map(({ name, fate, home }) => [name, fate, home?.number])).toEqual([
      ['Gilded', 'unchanged', '#ffd700'],
      ['Plain', 'added', '#ffffff'],
    ]);
    // Every row is accounted for: the second Gilded is refused with its reason.
    expect(refused.map((row) => row.rowNumber)).toEqual([3]);
  });
});

describe('who sees teams', () => {
  it('a manager lists and exports their own teams only', async () => {
    const { teams, divisions } = await listTeams(world.manager, { season: world.season.slug });
    expect(teams.map((team) => team.id)).toEqual([world.teams[0].id]);
    expect(divisions.map((division) => division.id)).toEqual([world.division.id]);
    const { csv } = await exportTeams(world.manager, { season: world.season.slug });
    expect(csv).toContain(world.teams[0].name);
    expect(csv).not.toContain(world.teams[1].name);
  });

  it('a league exports its teams without any player', async () => {
    const team = await buildTeam(world.league, world.division, { players: [{ name: 'Imre Tallow' }] });
    const { csv } = await exportTeams(world.referee, { season: world.season.slug });
    expect(csv).toContain(team.name);
    expect(csv).not.toContain('Tallow');
  });

  it('only a league admin adds, imports, changes and removes them', async () => {
    const { id: teamId, rowVersion } = await find(world.teams[0].slug);
    const fields = { name: 'Mine', divisionId: world.division.id, kits };
    for (const ctx of [world.manager, world.referee, world.decorator]) {
      const forbidden = { code: 'forbidden' };
      const season = world.season.slug;
      await expect(addTeam(ctx, { season, fields })).rejects.toMatchObject(forbidden);
      await expect(changeTeam(ctx, { teamId, rowVersion, fields })).rejects.toMatchObject(forbidden);
      await expect(removeTeam(ctx, { teamId })).rejects.toMatchObject(forbidden);
      const teams = [{ name: 'Mine', divisionId: world.division.id, home: null, away: null }];
      await expect(importTeams(ctx, { season, teams, refused: 0 })).rejects.toMatchObject(forbidden);
    }
    await expect(listTeams(world.decorator, { season: world.season.slug })).rejects.toMatchObject({
      code: 'forbidden',
    });
  });

  it('and nobody reaches a team of another league', async () => {
    const theirs = other.teams[0].id;
    await expect(removeTeam(world.admin, { teamId: theirs })).rejects.toMatchObject({ code: 'not-found' });
    await expect(
      changeTeam(world.admin, {
        teamId: theirs,
        rowVersion: 1,
        fields: { name: 'Ours now', divisionId: world.division.id, kits },
      }),
    ).rejects.toMatchObject({ code: 'not-found' });
  });
});
