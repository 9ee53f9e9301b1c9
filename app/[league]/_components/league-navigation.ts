import type { NavigationGroup } from '@/components/app-shell/navigation';
import type { Permission } from '@/lib/domain/access/permissions';
import { paths } from '@/lib/web/paths';

/** What the navigation is made from: where the reader is and what they may do. `season` is null before the first one. */
export type NavigationFacts = { league: string; season: string | null; abilities: readonly Permission[] };

type Line = { label: string; href: string; needs: Permission };

/** The pages of one season that this reader may open, by subject. */
function listSeasonLines(league: string, season: string) {
  const line = (label: string, href: string, needs: Permission): Line => ({ label, href, needs });
  return {
    plan: [
      line('Readiness', paths.readiness(league, season), 'readiness.read'),
      line('Dates', paths.dates(league, season), 'readiness.read'),
    ],
    teams: [
      line('Divisions', paths.divisions(league, season), 'division.read'),
      line('Teams', paths.teams(league, season), 'team.read'),
      line('Rosters', paths.rosters(league, season), 'roster.read'),
    ],
    make: [line('Batches', paths.batches(league, season), 'batch.make')],
    play: [line('Match check', paths.matchCheck(league, season), 'match.check')],
  };
}

/** The groups of the side panel: only what the reader's roles include, and no group without a line. */
export function listLeagueNavigation({ league, season, abilities }: NavigationFacts): NavigationGroup[] {
  const seasonal = season === null ? null : listSeasonLines(league, season);
  const mayMake = abilities.includes('batch.make');
  const groups: { title: string; items: Line[] }[] = [
    {
      title: 'Plan',
      items: [
        ...(seasonal?.plan ?? []),
        { label: 'Number rules', href: paths.numberRules(league), needs: 'rule-set.read' },
      ],
    },
    { title: 'Teams', items: seasonal?.teams ?? [] },
    {
      title: 'Make',
      items: [
        ...(seasonal?.make ?? []),
        ...(mayMake ? [] : [{ label: 'Batches', href: paths.shop(), needs: 'batch.read' } as const]),
      ],
    },
    { title: 'Play', items: seasonal?.play ?? [] },
    {
      title: 'League',
      items: [
        { label: 'Seasons', href: paths.seasons(league), needs: 'season.write' },
        { label: 'People', href: paths.people(league), needs: 'people.read' },
        { label: 'History', href: paths.history(league), needs: 'history.read' },
        { label: 'Settings', href: paths.settings(league), needs: 'league.settings' },
      ],
    },
  ];
  return groups
    .map(({ title, items }) => ({
      title,
      items: items
        .filter((item) => abilities.includes(item.needs))
        .map(({ label, href }) => ({ label, href })),
    }))
    .filter((group) => group.items.length > 0);
}

/** The three or four pages a phone keeps at its foot; none when there are fewer than two. */
export function listPhoneTabs(facts: NavigationFacts): { href: string; label: string }[] {
  const wanted = ['Readiness', 'Rosters', 'Teams', 'Batches', 'Match check'];
  const lines = listLeagueNavigation(facts).flatMap((group) => group.items);
  const tabs = wanted.flatMap((label) => lines.find((line) => line.label === label) ?? []).slice(0, 4);
  return tabs.length < 2 ? [] : tabs.map(({ href, label }) => ({ href, label }));
}

/**
 * Where a change of season leads: the same subject in the other season (`/league/2026/teams/otters` to
 * `/league/2027/teams`), or the first page of it when the reader is on a page of the whole league.
 */
export function findSameSubject(pathname: string, from: string | null, facts: NavigationFacts): string {
  const [, league, season, subject] = pathname.split('/');
  const lines = listLeagueNavigation(facts).flatMap((group) => group.items);
  const first = lines[0]?.href ?? paths.league(facts.league);
  if (league !== facts.league || season !== from || subject === undefined || facts.season === null)
    return first;
  const same = `/${facts.league}/${facts.season}/${subject}`;
  return lines.some((line) => line.href === same) ? same : first;
}
