import type { DataColumn } from '@/components/ui/data-column';
import { TextLink } from '@/components/ui/text-link';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';

/** The columns that name a team wherever its roster is listed: found by the team's name and by its players'. */
export const makeTeamColumns = (league: string, season: string): DataColumn<ReadyTeam>[] => [
  {
    id: 'team',
    header: 'Team',
    rowHead: true,
    cell: (team) => (
      <span className="flex items-center gap-3">
        <YokeTile kit={team.kit} number="12" />
        <TextLink
          href={paths.roster(league, season, team.slug)}
          className="text-ink! min-w-0 font-[620]! break-words no-underline! hover:underline!"
        >
          {team.name}
        </TextLink>
      </span>
    ),
    sortValue: (team) => team.name,
    searchText: (team) => `${team.name} ${team.playerNames.join(' ')}`,
  },
  {
    id: 'division',
    header: 'Division',
    cell: (team) => <span className="text-dusk">{team.division}</span>,
    sortValue: (team) => team.division,
    searchText: (team) => team.division,
  },
];
