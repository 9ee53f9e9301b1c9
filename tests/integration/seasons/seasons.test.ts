import { beforeAll, describe, expect, it } from 'vitest';
import { changeSeason } from '@/lib/use-cases/seasons/change-season';
import { chooseCurrentSeason } from '@/lib/use-cases/seasons/choose-current-season';
import { getSeason } from '@/lib/use-cases/seasons/get-season';
import { listSeasons } from '@/lib/use-cases/seasons/list-seasons';
import { openSeason } from '@/lib/use-cases/seasons/open-season';
import { seasonFieldsSchema, type SeasonInput } from '@/lib/use-cases/seasons/season-schemas';
import {
  buildDivision,
  buildLeague,
  buildMember,
  buildWorld,
  type FurnishedLeague,
} from '../../factories/league';
import { codeOf } from '../../support/outcomes';
import { queryAsAdmin } from '../../support/database';

const spring: SeasonInput = {
  name: 'Spring 2028',
  sport: 'basketball',
  rosterOpensOn: '2028-01-10',
  freezesAt: '2028-02-04T18:00',
  releaseOn: '2028-02-07',
  handOutOn: '2028-03-18',
  firstMatchOn: '2028-03-25',
};
const faultsOf = (change: Partial<SeasonInput>) =>
  seasonFieldsSchema
    .safeParse({ ...spring, ...change })
    .error?.issues.map((issue) => [issue.path.join('.'), issue.message]) ?? [];

const eventsOf = (subjectId: string) =>
  queryAsAdmin<{ type: string; data: Record<string, unknown> }>(
    'select type, data from audit_events where subject_id = $1 order by at, id',
    [subjectId],
  );
const freezeJob = async (seasonId: string) => {
  const rows = await queryAsAdmin<{ run_at: Date }>(
    'select run_at from graphile_worker.jobs where key = $1',
    [`freeze:${seasonId}`],
  );
  return rows.map((row) => row.run_at.toISOString());
};

let world: FurnishedLeague;
beforeAll(async () => {
  [world] = await buildWorld();
});

describe('the order of a season’s dates', () => {
  it('is taken when they follow each other', () => {
    expect(faultsOf({})).toEqual([]);
    expect(faultsOf({ releaseOn: null })).toEqual([]);
    expect(faultsOf({ firstMatchOn: spring.handOutOn })).toEqual([]);
  });

  it('is refused with a sentence at the date that stands wrong', () => {
    expect(faultsOf({ freezesAt: '2028-01-10T18:00' })).toEqual([
      ['freezesAt', 'Rosters freeze at least a day after they open.'],
    ]);
    expect(faultsOf({ firstMatchOn: '2028-03-17' })).toEqual([
      ['firstMatchOn', 'The first match cannot be before the kit is handed out.'],
    ]);
    expect(faultsOf({ releaseOn: '2028-02-03' }).map(([field]) => field)).toEqual(['releaseOn']);
    expect(faultsOf({ releaseOn: '2028-03-19' }).map(([field]) => field)).toEqual(['releaseOn']);
    expect(faultsOf({ freezesAt: '2028-03-18T09:00', releaseOn: null }).map(([field]) => field)).toEqual([
      'handOutOn',
    ]);
  });

  it('is not asked of what is no date', () => {
    expect(faultsOf({ handOutOn: '2028-02-30' })).toEqual([['handOutOn', 'Choose a day of the calendar.']]);
  });
});

describe('opening a season', () => {
  it('keeps the freeze as the instant on the league’s clocks, and puts it on the worker’s calendar', async () => {
    const { slug } = await openSeason(world.admin, seasonFieldsSchema.parse(spring));
    const { season } = await getSeason(world.referee, { season: slug });
    expect(season.freezesAt).toEqual(new Date('2028-02-04T18:00:00Z'));
    expect(await freezeJob(season.id)).toEqual(['2028-02-04T18:00:00.000Z']);
    expect(await eventsOf(season.id)).toEqual([{ type: 'season opened', data: { name: 'Spring 2028' } }]);
  });

  it('makes the first season of a league its current one, and leaves it that when more follow', async () => {
    const league = await buildLeague();
    const { ctx } = await buildMember(league, 'league admin');
    const first = await openSeason(ctx, seasonFieldsSchema.parse({ ...spring, name: 'First' }));
    await openSeason(ctx, seasonFieldsSchema.parse({ ...spring, name: 'Second' }));
    const [row] = await queryAsAdmin<{ slug: string }>(
      'select s.slug from leagues l join seasons s on s.id = l.current_season_id where l.id = $1',
      [league.id],
    );
    expect(row?.slug).toBe(first.slug);
  });

  it('gives every season an address of its own, also next to pages that are there', async () => {
    const slugs = [];
    for (const name of ['Été', 'Ete', 'People', '夏'])
      slugs.push((await openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name }))).slug);
    expect(slugs).toEqual(['ete', 'ete-2', 'people-1', 'season']);
  });

  it('refuses a name the league has, whatever the case, also when two ask at the same moment', async () => {
    const ask = () => openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'Autumn 2028' }));
    const outcomes = await Promise.allSettled([ask(), ask()]);
    expect(outcomes.map(codeOf).sort()).toEqual(['conflict', 'done']);
    await expect(
      openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'AUTUMN 2028' })),
    ).rejects.toMatchObject({ code: 'conflict', fields: { name: expect.stringContaining('AUTUMN 2028') } });
  });
});

describe('changing a season', () => {
  it('keeps both values of what changed, and moves the freeze on the worker’s calendar', async () => {
    const { slug } = await openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'Moved' }));
    const { season } = await getSeason(world.admin, { season: slug });
    // Summer time: 18:00 on the wall is 17:00 in UTC.
    const fields = seasonFieldsSchema.parse({
      ...spring,
      name: 'Moved',
      freezesAt: '2028-04-07T18:00',
      releaseOn: null,
      handOutOn: '2028-05-06',
      firstMatchOn: '2028-05-13',
    });
    await changeSeason(world.admin, { seasonId: season.id, rowVersion: season.rowVersion, fields });
    expect(await freezeJob(season.id)).toEqual(['2028-04-07T17:00:00.000Z']);
    expect((await eventsOf(season.id)).find((event) => event.type === 'season changed')).toEqual({
      type: 'season changed',
      data: {
        name: 'Moved',
        changes: {
          freezesAt: { from: '2028-02-04T18:00:00.000Z', to: '2028-04-07T17:00:00.000Z' },
          releaseOn: { from: '2028-02-07', to: null },
          handOutOn: { from: '2028-03-18', to: '2028-05-06' },
          firstMatchOn: { from: '2028-03-25', to: '2028-05-13' },
        },
      },
    });
  });

  it('turns a stale writer away and keeps what the first one wrote', async () => {
    const { slug } = await openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'Shared' }));
    const { season } = await getSeason(world.admin, { season: slug });
    const write = (sport: string) =>
      changeSeason(world.admin, {
        seasonId: season.id,
        rowVersion: season.rowVersion,
        fields: seasonFieldsSchema.parse({ ...spring, name: 'Shared', sport }),
      });
    await write('netball');
    await expect(write('handball')).rejects.toMatchObject({
      code: 'conflict',
      message:
        'Somebody changed this season since you opened it. Your entries are kept here; reload to see theirs.',
    });
    expect((await getSeason(world.admin, { season: slug })).season.sport).toBe('netball');
  });

  it('writes nothing into the history when nothing changed', async () => {
    const { slug } = await openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'Same' }));
    const { season } = await getSeason(world.admin, { season: slug });
    const fields = seasonFieldsSchema.parse({ ...spring, name: 'Same' });
    await changeSeason(world.admin, { seasonId: season.id, rowVersion: season.rowVersion, fields });
    expect((await eventsOf(season.id)).map((event) => event.type)).toEqual(['season opened']);
  });

  it('does not leave the freeze of a division outside the season’s days', async () => {
    const { slug } = await openSeason(world.admin, seasonFieldsSchema.parse({ ...spring, name: 'Tight' }));
    const { season } = await getSeason(world.admin, { season: slug });
    await buildDivision(world.league, season, { name: 'U10', freezesAt: new Date('2028-03-10T18:00Z') });
    const fields = seasonFieldsSchema.parse({ ...spring, name: 'Tight', handOutOn: '2028-03-08' });
    await expect(
      changeSeason(world.admin, { seasonId: season.id, rowVersion: season.rowVersion, fields }),
    ).rejects.toMatchObject({
      code: 'invalid',
      fields: {
        handOutOn:
          'U10 freezes on Friday 10 March, which would be on or after the hand-out day. Change its own freeze first.',
      },
    });
  });
});

describe('the current season', () => {
  it('is chosen by a league admin and told in the history once', async () => {
    const [own] = await buildWorld();
    const { slug } = await openSeason(own.admin, seasonFieldsSchema.parse({ ...spring, name: 'Next' }));
    const { season } = await getSeason(own.admin, { season: slug });
    await chooseCurrentSeason(own.admin, { seasonId: season.id });
    await chooseCurrentSeason(own.admin, { seasonId: season.id });
    const changes = (await eventsOf(own.league.id)).filter((event) => event.type === 'league changed');
    expect(changes).toEqual([
      { type: 'league changed', data: { changes: { currentSeason: { from: own.season.name, to: 'Next' } } } },
    ]);
  });

  it('cannot be a season of another league', async () => {
    const [one, two] = await buildWorld({ leagues: 2 });
    await expect(chooseCurrentSeason(one.admin, { seasonId: two.season.id })).rejects.toMatchObject({
      code: 'not-found',
    });
  });
});

it('only a league admin opens, changes and lists seasons', async () => {
  const { season } = await getSeason(world.admin, { season: world.season.slug });
  const fields = seasonFieldsSchema.parse({ ...spring, name: 'Nobody’s' });
  for (const ctx of [world.manager, world.referee, world.decorator]) {
    const forbidden = { code: 'forbidden' };
    await expect(openSeason(ctx, fields)).rejects.toMatchObject(forbidden);
    await expect(
      changeSeason(ctx, { seasonId: season.id, rowVersion: season.rowVersion, fields }),
    ).rejects.toMatchObject(forbidden);
    await expect(chooseCurrentSeason(ctx, { seasonId: season.id })).rejects.toMatchObject(forbidden);
    await expect(listSeasons(ctx)).rejects.toMatchObject(forbidden);
  }
});
