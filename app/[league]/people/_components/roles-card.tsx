import { Card } from '@/components/ui/card';
import { Icon } from '@/components/ui/icon';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { permissionTable, roles, type Reach, type Role } from '@/lib/domain/access/permissions';
import { capitalise } from '@/lib/domain/text/sentence';

const says: Record<Reach, string> = {
  league: 'Yes',
  'own teams': 'Own teams',
  'own shop': 'Own batches',
  none: 'No',
};

/** Who may do what, printed from the table the program itself goes by. */
export function RolesCard() {
  return (
    <Card
      title="What each role may do"
      aside="Somebody with several roles may do what any of them may."
      flush
    >
      <Table caption="What each role may do" cards>
        <Thead>
          <Th>What</Th>
          {roles.map((role) => (
            <Th key={role} className="max-sm:hidden">
              {capitalise(role)}
            </Th>
          ))}
          <Th className="sm:hidden">Who</Th>
        </Thead>
        <Tbody>
          {Object.entries(permissionTable).map(([permission, row]) => (
            <Tr key={permission}>
              <Td rowHead>{row.says}</Td>
              {roles.map((role) => (
                <Td key={role} className="max-sm:hidden!">
                  <ReachMark reach={row.reach[role]} />
                </Td>
              ))}
              <Td className="text-left! sm:hidden">{listHolders(row.reach)}</Td>
            </Tr>
          ))}
        </Tbody>
      </Table>
    </Card>
  );
}

/** The same in one line, for a phone: "League admin, team manager (own teams)". */
function listHolders(reach: Record<Role, Reach>): string {
  const line = roles
    .filter((role) => reach[role] !== 'none')
    .map((role) => (reach[role] === 'league' ? role : `${role} (${says[reach[role]].toLowerCase()})`))
    .join(', ');
  return capitalise(line);
}

function ReachMark({ reach }: { reach: Reach }) {
  if (reach === 'none') return <span className="text-dusk">{says.none}</span>;
  return (
    <span className="inline-flex items-center gap-1.5 font-[560] whitespace-nowrap">
      <Icon name="tick" size={14} className="text-set" />
      {says[reach]}
    </span>
  );
}
