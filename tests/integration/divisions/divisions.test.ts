import { beforeAll, describe, expect, it } from 'vitest';
import { addDivision } from '@/lib/use-cases/divisions/add-division';
import { changeDivision } from '@/lib/use-cases/divisions/change-division';
import { divisionFieldsSchema, type DivisionInput } from '@/lib/use-cases/divisions/division-schemas';
import { getDivisionForm, listDivisions } from '@/lib/use-cases/divisions/list-divisions';
import { removeDivision } from '@/lib/use-cases/divisions/remove-division';
import {
  buildDivision,
  buildTeam,
  buildWorld,
  someGarments,
  type FurnishedLeague,
} from '../../factories/league';
import { codeOf } from '../../support/outcomes';
import { whileTeamIsAdded } from '../../support/slow-writer';
import { queryAsAdmin } from '../../support/database';

let world: FurnishedLeague;
let other: FurnishedLeague;
beforeAll(async () => {
  [world, other] = await buildWorld({ leagues: 2 });
});

const fieldsOf = (change: Partial<DivisionInput>) =>
  divisionFieldsSchema.parse({
    name: 'U12 Mixed',
    ageBand: '10 to 12 years',
    level: '',
    ruleSetId: world.ruleSet.id,
    leastPlayers: 7,
    mostPlayers: 12,
    freezesAt: null,
    garments: someGarments,
    ...change,
  });
const read = async (slug: string) => {
  const { division } = await getDivisionForm(world.admin, { season: world.season.slug, division: slug });
  if (!division) throw new Error('no such division');
  return division;
};
const freezeJobs = (divisionId: string) =>
  queryAsAdmin<{ run_at: Date; payload: unknown }>(
    `select j.run_at, p.payload from graphile_worker.jobs j join graphile_worker._private_jobs p using (id) where j.key = $1`,
    [`freeze:${world.season.id}:${divisionId}`],
  );

describe('adding a division', () => {
  it('keeps its limits and its garments with their sizes in order', async () => {
    const garments = [
      ...someGarments,
      {
        code: 'shorts',
        name: 'Shorts',
        worn: 'home' as const,
        numbered: false,
        named: false,
        sizes: [{ code: 'YM', label: 'Youth medium' }],
      },
    ];
    const { slug } = await addDivision(world.admin, {
      season: world.season.slug,
      fields: fieldsOf({ name: 'Ordered', garments }),
    });
    expect(await read(slug)).toMatchObject({
      leastPlayers: 7,
      mostPlayers: 12,
      garments,
      ownFreezesAt: null,
    });
  });

  it('puts a freeze of its own on the worker’s calendar beside the season’s', async () => {
    const { slug } = await addDivision(world.admin, {
      season: world.season.slug,
      fields: fieldsOf({ name: 'Early', freezesAt: '2027-03-08T12:00' }),
    });
    const division = await read(slug);
    expect(division.freezesAt).toEqual(new Date('2027-03-08T12:00:00Z'));
    expect(await freezeJobs(division.id)).toEqual([
      {
        run_at: new Date('2027-03-08T12:00:00Z'),
        payload: { leagueId: world.league.id, seasonId: world.season.id },
      },
    ]);
  });

  it('refuses a freeze of its own that is not between opening and hand-out', async () => {
    for (const [freezesAt, says] of [
      ['2027-02-15T12:00', 'Rosters freeze at least a day after they open.'],
      ['2027-04-10T09:00', 'A division freezes at least a day before the hand-out day.'],
    ] as const) {
      await expect(
        addDivision(world.admin, { season: world.season.slug, fields: fieldsOf({ name: 'Out', freezesAt }) }),
      ).rejects.toMatchObject({ code: 'invalid', fields: { 'fields.freezesAt': says } });
    }
  });

  it('gives divisions of one season addresses of their own and refuses a second one of the same name', async () => {
    const add = (name: string) =>
      addDivision(world.admin, { season: world.season.slug, fields: fieldsOf({ name }) });
    expect(await add('Girls U-14')).toEqual({ slug: 'girls-u-14' });
    expect(await add('Girls U 14')).toEqual({ slug: 'girls-u-14-2' });
    expect(await add('New')).toEqual({ slug: 'new-1' });
    await expect(add('girls u-14')).rejects.toMatchObject({ code: 'conflict' });
    const twice = await Promise.allSettled([add('Boys'), add('Boys')]);
    expect(twice.map(codeOf).sort()).toEqual(['conflict', 'done']);
  });

  it('takes only rule sets and seasons of its own league', async () => {
    const elsewhere = fieldsOf({ name: 'Elsewhere', ruleSetId: other.ruleSet.id });
    await expect(
      addDivision(world.admin, { season: world.season.slug, fields: elsewhere }),
    ).rejects.toMatchObject({ code: 'not-found' });
    await expect(
      addDivision(world.admin, { season: other.season.slug, fields: fieldsOf({ name: 'Elsewhere' }) }),
    ).rejects.toMatchObject({ code: 'not-found' });
  });

  it('refuses limits the wrong way round, twin garments and twin sizes, each at its field', () => {
    const jersey = someGarments[0];
    if (!jersey) throw new Error('no garment');
    const paths = (change: Partial<DivisionInput>) =>
      divisionFieldsSchema
        .safeParse({ ...fieldsOf({}), ...change })
        .error?.issues.map((issue) => issue.path.join('.'));
    expect(paths({ leastPlayers: 13 })).toEqual(['mostPlayers']);
    expect(paths({ garments: [jersey, { ...jersey, code: 'jersey-2' }] })).toEqual(['garments.1.name']);
    expect(
      paths({
        garments: [
          {
            ...jersey,
            sizes: [
              { code: 'YM', label: 'a' },
              { code: 'ym', label: 'b' },
            ],
          },
        ],
      }),
    ).toEqual(['garments.0.sizes']);
  });
});

describe('changing a division', () => {
  it('keeps what changed with both values, and turns a stale writer away', async () => {
    const { slug } = await addDivision(world.admin, {
      season: world.season.slug,
      fields: fieldsOf({ name: 'Changed' }),
    });
    const { id: divisionId, rowVersion } = await read(slug);
    const change = (mostPlayers: number) =>
      changeDivision(world.admin, {
        divisionId,
        rowVersion,
        fields: fieldsOf({ name: 'Changed', mostPlayers }),
      });
    await change(14);
    await expect(change(15)).rejects.toMatchObject({ code: 'conflict' });
    expect((await read(slug)).mostPlayers).toBe(14);
    const [event] = await queryAsAdmin(
      `select data from audit_events where subject_id = $1 and type = 'division changed'`,
      [divisionId],
    );
    expect(event).toEqual({ data: { name: 'Changed', changes: { mostPlayers: { from: 12, to: 14 } } } });
  });

  it('reaches no division of another league', async () => {
    await expect(
      changeDivision(world.admin, { divisionId: other.division.id, rowVersion: 1, fields: fieldsOf({}) }),
    ).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('removing a division', () => {
  it('is refused with the number of its teams while it has any', async () => {
    await expect(removeDivision(world.admin, { divisionId: world.division.id })).rejects.toMatchObject({
      code: 'conflict',
      message: `${world.division.name} has 3 teams. Move or remove them first.`,
    });
  });

  it('takes an empty one away with its garments', async () => {
    const division = await buildDivision(world.league, world.season);
    await removeDivision(world.admin, { divisionId: division.id });
    expect(await queryAsAdmin('select 1 from garments where division_id = $1', [division.id])).toEqual([]);
  });

  it('waits for whoever is adding a team to it, and is then refused', async () => {
    const division = await buildDivision(world.league, world.season);
    const place = { leagueId: world.league.id, seasonId: world.season.id, divisionId: division.id };
    const outcome = await whileTeamIsAdded(place, { name: 'Late', slug: 'late' }, () =>
      removeDivision(world.admin, { divisionId: division.id }),
    );
    expect(codeOf(outcome)).toBe('conflict');
  });
});

describe('who sees divisions', () => {
  it('a manager sees those of their own teams, a referee all of them, a decorator none', async () => {
    const division = await buildDivision(world.league, world.season);
    await buildTeam(world.league, division);
    const names = async (ctx: typeof world.admin) =>
      (await listDivisions(ctx, { season: world.season.slug })).divisions.map((entry) => entry.name);
    expect(await names(world.manager)).toEqual([world.division.name]);
    expect(await names(world.referee)).toEqual(await names(world.admin));
    await expect(names(world.decorator)).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('and only a league admin changes them', async () => {
    for (const ctx of [world.manager, world.referee, world.decorator]) {
      const forbidden = { code: 'forbidden' };
      const fields = fieldsOf({ name: 'Nobody’s' });
      await expect(addDivision(ctx, { season: world.season.slug, fields })).rejects.toMatchObject(forbidden);
      await expect(
        changeDivision(ctx, { divisionId: world.division.id, rowVersion: 1, fields }),
      ).rejects.toMatchObject(forbidden);
      await expect(removeDivision(ctx, { divisionId: world.division.id })).rejects.toMatchObject(forbidden);
      await expect(getDivisionForm(ctx, { season: world.season.slug, division: null })).rejects.toMatchObject(
        forbidden,
      );
    }
  });
});
