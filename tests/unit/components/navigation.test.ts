import { expect, it } from 'vitest';
import { findCurrent } from '@/components/app-shell/navigation';

it('the present page is the deepest line of the navigation that holds the address', () => {
  const hrefs = ['/tern/a/teams', '/tern/a/teams/import', '/tern/a/rosters'];
  expect(findCurrent('/tern/a/teams/import', hrefs)).toBe('/tern/a/teams/import');
  expect(findCurrent('/tern/a/rosters/otters', hrefs)).toBe('/tern/a/rosters');
  expect(findCurrent('/tern/a/teams-old', hrefs)).toBeNull();
});
