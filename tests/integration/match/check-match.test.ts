import { beforeAll, describe, expect, it } from 'vitest';
import type { ActorContext } from '@/lib/use-cases/context';
import { checkMatch } from '@/lib/use-cases/match/check-match';
import {
  buildDivision,
  buildTeam,
  buildWorld,
  someKit,
  type BuiltTeam,
  type FurnishedLeague,
} from '../../factories/league';
import { queryAsAdmin } from '../../support/database';

const white = { name: 'white', body: '#ffffff', sleeves: '#ffffff', number: '#111111', outline: null };

let world: FurnishedLeague;
let elsewhere: FurnishedLeague;
let herons: BuiltTeam;
let egrets: BuiltTeam;
/** The manager of the herons, and of nobody else. */
let manager: ActorContext;

beforeAll(async () => {
  [world, elsewhere] = await buildWorld({ leagues: 2 });
  herons = await buildTeam(world.league, world.division, {
    name: 'Herons',
    players: [
      { name: 'Calloway, Ines', number: '14', role: 'guard', sizes: { jersey: 'YM' } },
      { name: 'Dunmore, Pip', number: '00' },
      { name: 'Wren', number: '0' },
    ],
  });
  egrets = await buildTeam(world.league, world.division, {
    name: 'Egrets',
    kits: { home: someKit, away: white },
    players: [
      { name: 'Ashdown, Una', number: '7', nameOnBack: 'ASHDOWN', sizes: { jersey: 'YL' } },
      { name: 'Merrow, Jo', number: '7' },
      { name: 'Tansley, Bo', number: '100' },
      { name: 'Quill, Ro', number: '' },
    ],
  });
  manager = { ...world.manager, actor: { ...world.manager.actor, teamIds: [herons.id] } };
});

const check = (ctx: ActorContext, home: string | null = herons.slug, away: string | null = egrets.slug) =>
  checkMatch(ctx, { season: world.season.slug, division: world.division.slug, home, away });
const checkBoth = async (ctx: ActorContext) => {
  const { match } = await check(ctx);
  if (!match) throw new Error('no match');
  return match;
};

describe('a match check', () => {
  it('shows an official who wears which number on both sides, in the order of the numbers', async () => {
    const { home, away } = await checkBoth(world.referee);
    expect(home.players).toEqual([
      { number: '00', name: 'Dunmore', trouble: false },
      { number: '0', name: 'Wren', trouble: false },
      { number: '14', name: 'Calloway', trouble: false },
    ]);
    expect(away.players.map(({ number, name, trouble }) => [number, name, trouble])).toEqual([
      ['7', 'Ashdown', true],
      ['7', 'Merrow', true],
      ['100', 'Tansley', true],
      ['', 'Quill', true],
    ]);
  });

  it('says once of each number worn twice who wears it, and of every other trouble whose it is', async () => {
    const { home, away } = await checkBoth(world.referee);
    expect(home.troubles).toEqual([]);
    expect(away.troubles[0]).toBe('7 is on 2 shirts: Ashdown and Merrow. One must change before play.');
    expect(away.troubles).toHaveLength(3);
    expect(away.troubles.filter((line) => line.startsWith('Tansley: '))).toHaveLength(1);
    expect(away.troubles.filter((line) => line.startsWith('Quill: '))).toHaveLength(1);
  });

  it('gives an official nothing of a child but the number and a name to call', async () => {
    const told = JSON.stringify(await checkBoth(world.referee));
    for (const secret of ['Ines', 'Pip', 'Una', 'guard', 'YM', 'YL', 'ASHDOWN'])
      expect([secret, told.includes(secret)]).toEqual([secret, false]);
  });

  it('gives a manager the names of their own team and none of the other, not even in a sentence', async () => {
    for (const sides of [await checkBoth(manager), (await check(manager, egrets.slug, herons.slug)).match]) {
      const [own, other] =
        sides?.home.slug === herons.slug ? [sides.home, sides.away] : [sides?.away, sides?.home];
      expect(own?.players.map(({ name }) => name)).toEqual(['Dunmore', 'Wren', 'Calloway']);
      expect(other?.players.map(({ number, name }) => [number, name])).toEqual([
        ['7', ''],
        ['7', ''],
        ['100', ''],
        ['', ''],
      ]);
      expect(other?.troubles).toEqual(['4 numbers to check.']);
      const told = JSON.stringify(sides);
      for (const name of ['Ashdown', 'Merrow', 'Tansley', 'Quill'])
        expect([name, told.includes(name)]).toEqual([name, false]);
    }
  });

  it('names nobody to a manager when neither team is theirs', async () => {
    const told = JSON.stringify(await checkBoth(world.manager));
    for (const name of ['Calloway', 'Dunmore', 'Wren', 'Ashdown', 'Merrow'])
      expect([name, told.includes(name)]).toEqual([name, false]);
  });

  it('says that two kits clash, and which other kit of the two tells them apart', async () => {
    const { asListed, kits } = await checkBoth(world.referee);
    expect(asListed.verdict).toBe('clash');
    expect(kits.chosen).toMatchObject({ homeKit: { name: 'navy' }, awayKit: { name: 'white' } });
    expect(kits.chosen?.comparison.verdict).toBe('clear');
  });

  it('compares only two different teams of one division, and otherwise offers the choice', async () => {
    const other = await buildDivision(world.league, world.season);
    const stranger = await buildTeam(world.league, other, { players: [{ name: 'Vale, Su' }] });
    for (const [home, away] of [
      [null, null],
      [herons.slug, null],
      [herons.slug, herons.slug],
      [herons.slug, stranger.slug],
      [herons.slug, 'nobody'],
      [herons.slug, elsewhere.teams[0].slug],
    ] as const)
      expect([home, away, (await check(world.referee, home, away)).match]).toEqual([home, away, null]);
    const { choice } = await check(world.referee, null, null);
    expect(choice.teams.map(({ slug }) => slug)).toEqual(
      expect.arrayContaining([herons.slug, egrets.slug]) as unknown,
    );
    expect(choice.teams.map(({ slug }) => slug)).not.toContain(stranger.slug);
  });

  it('is for admins, referees and managers of a team; a decorator, or a manager of none, is refused', async () => {
    await expect(check(world.admin)).resolves.toMatchObject({
      match: { rules: expect.any(String) as unknown },
    });
    const ofNone = { ...world.manager, actor: { ...world.manager.actor, teamIds: [] } };
    for (const ctx of [world.decorator, ofNone])
      await expect(check(ctx)).rejects.toMatchObject({ code: 'forbidden' });
    await expect(check(elsewhere.referee)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('only reads', async () => {
    const count = () =>
      queryAsAdmin('select count(*)::int as n, max(updated_at) as at from players where league_id = $1', [
        world.league.id,
      ]);
    const before = await count();
    await checkBoth(world.referee);
    expect(await count()).toEqual(before);
  });
});
