import { afterAll, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { listSeasonLinks } from '@/lib/use-cases/seasons/list-season-links';
import { buildWorld } from '../../factories/league';

afterAll(closeDatabase);

it('shows a league only its own seasons', async () => {
  const [one, two] = await buildWorld({ leagues: 2 });
  expect(await listSeasonLinks(one.admin)).toEqual([{ slug: one.season.slug, name: one.season.name }]);
  expect(await listSeasonLinks(two.referee)).toEqual([{ slug: two.season.slug, name: two.season.name }]);
});
