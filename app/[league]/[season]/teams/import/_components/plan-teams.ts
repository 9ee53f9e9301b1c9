import type { Kit, TeamKits } from '@/lib/domain/kit/kit';
import { makeKitOfColours } from '@/lib/domain/kit/kit-of-colours';
import type { TeamLine, TeamsReading } from '@/lib/domain/roster/import/read-teams';

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
    known.number.toLowerCase() !== incoming.number.toLowerCase());

/**
 * A kit of the list as it would be worn. Where the list names no colour for the number, a team that keeps its body
 * colour keeps its number's too.
 */
function readKit(line: TeamLine['home'], known: Kit | null | undefined): Kit | null {
  if (!line) return null;
  const kept = known && known.body.toLowerCase() === line.colour.hex ? { name: '', hex: known.number } : null;
  return makeKitOfColours(line.colour, line.number ?? kept);
}

/** What an import would do with each team of a list; a team that stands twice in one division is only taken once. */
export function planTeams(lines: TeamsReading['lines'], known: readonly Known[]): PlannedTeam[] {
  const byKey = new Map(known.map((team) => [keyOf(team), team]));
  const seen = new Set<string>();
  return lines.map(({ rowNumber, line, notes }) => {
    const key = keyOf(line);
    const twin = byKey.get(key);
    const home = readKit(line.home, twin?.kits.home);
    const away = readKit(line.away, twin?.kits.away);
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
