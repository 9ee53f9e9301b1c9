import { Card } from '@/components/ui/card';
import { Notice } from '@/components/ui/notice';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { StatusText } from '@/components/ui/tag';
import type { Tone } from '@/components/ui/status-mark';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import type { TeamsReading } from '@/lib/domain/roster/import/read-teams';
import { countOf } from '@/lib/domain/text/count-of';
import type { PlannedTeam } from './plan-teams';

const fates: Record<PlannedTeam['fate'], { tone: Tone; says: string }> = {
  added: { tone: 'set', says: 'new' },
  changed: { tone: 'note', says: 'colours change' },
  unchanged: { tone: 'wait', says: 'as it is' },
  twice: { tone: 'care', says: 'stands twice, left out' },
};

/** What an import would do, row by row, and the rows it cannot take. */
export function TeamPlanTable({
  teams,
  refused,
  divisions,
}: {
  teams: readonly PlannedTeam[];
  refused: TeamsReading['refused'];
  divisions: readonly { id: string; name: string }[];
}) {
  return (
    <Card flush title="What it would do" aside={countOf(teams.length, 'team')}>
      <Table caption="Teams of the list" cards>
        <Thead>
          <Th>Row</Th>
          <Th>Team</Th>
          <Th>Division</Th>
          <Th>Home</Th>
          <Th>Away</Th>
          <Th>What happens</Th>
        </Thead>
        <Tbody>
          {teams.map((team) => (
            <Tr key={team.rowNumber}>
              <Td label="Row" className="text-dusk">
                {team.rowNumber}
              </Td>
              <Td rowHead label="Team" className="break-words">
                <bdi>{team.name}</bdi>
              </Td>
              <Td label="Division">{divisions.find((division) => division.id === team.divisionId)?.name}</Td>
              <Td label="Home">
                {team.home ? <YokeTile kit={team.home} number="12" label={team.home.name} /> : '–'}
              </Td>
              <Td label="Away">
                {team.away ? <YokeTile kit={team.away} number="12" label={team.away.name} /> : '–'}
              </Td>
              <Td label="What happens">
                <StatusText tone={fates[team.fate].tone}>{fates[team.fate].says}</StatusText>
                {team.notes.map((note) => (
                  <span key={note} className="type-small text-dusk block">
                    {note}
                  </span>
                ))}
              </Td>
            </Tr>
          ))}
        </Tbody>
      </Table>
      {refused.length > 0 && (
        <Notice tone="care" flush title={`${countOf(refused.length, 'row')} cannot be taken`}>
          <ul className="grid gap-1">
            {refused.map((row) => (
              <li key={row.rowNumber}>
                Row {row.rowNumber}: {row.reason}{' '}
                <span className="type-code break-words">{row.cells.filter(Boolean).join(' | ')}</span>
              </li>
            ))}
          </ul>
        </Notice>
      )}
    </Card>
  );
}
