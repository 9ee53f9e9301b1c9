import type { Kit, TeamKits } from '@/lib/domain/kit/kit';
import { makeKitOfColours } from '@/lib/domain/kit/kit-of-colours';
import type { TeamsReading } from '@/lib/domain/roster/import/read-teams';

export type PlannedTeam = {
  rowNumber: number;
  name: string;
  divisionId: string;
  home: Kit | null;
  away: Kit | null;
  notes: string[];
  fate: 'added' | 'changed' | 'unchanged' | 'twice';
};

type Known = { name: string; divisionId: string; kits: TeamKits };

const keyOf = (team: { name: string; divisionId: string }): string =>
  `${team.divisionId}/${team.name.toLowerCase()}`;

const differs = (known: Kit | null, incoming: Kit | null): boolean =>
  incoming !== null &&
  (known?.body.toLowerCase() !== incoming.body ||
    known.name !== incoming.name ||
    known.number.toLowerCase() !== incoming.number);

/** What an import would do with each team of a list; a team that stands twice in one division is only taken once. */
export function planTeams(lines: TeamsReading['lines'], known: readonly Known[]): PlannedTeam[] {
  const byKey = new Map(known.map((team) => [keyOf(team), team]));
  const seen = new Set<string>();
  return lines.map(({ rowNumber, line, notes }) => {
    const home = line.home && makeKitOfColours(line.home.colour, line.home.number);
    const away = line.away && makeKitOfColours(line.away.colour, line.away.number);
    const key = keyOf(line);
    const twin = byKey.get(key);
    const fate = seen.has(key)
      ? 'twice'
      : !twin
        ? 'added'
        : differs(twin.kits.home, home) || differs(twin.kits.away, away)
          ? 'changed'
          : 'unchanged';
    seen.add(key);
    return {
      rowNumber,
      name: line.name,
      divisionId: line.divisionId,
      home,
      away,
      notes: [...notes, ...noteManagers(line.managers)],
      fate,
    };
  });
}

const noteManagers = (managers: readonly string[]): string[] =>
  managers.length === 0 ? [] : [`Invite ${managers.join(', ')} on the People page once the team is here.`];
