import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { describeRoles } from '@/lib/domain/access/describe-roles';
import { paths } from '@/lib/web/paths';
import { describePerson } from '@/lib/web/person-navigation';
import { requirePerson } from '@/lib/web/session';

export const metadata: Metadata = { title: 'Your leagues' };

export default async function LeaguesPage() {
  const { person } = await requirePerson(paths.leagues());
  const create = (
    <ButtonLink
      href={paths.newLeague()}
      look={person.leagues.length === 0 ? 'primary' : 'secondary'}
      icon="add"
    >
      Create a league
    </ButtonLink>
  );
  return (
    <>
      <PageHeader
        title="Your leagues"
        subtitle={person.leagues.length > 0 && `${describePerson(person)}.`}
        actions={person.leagues.length > 0 && create}
      />
      <Card flush>
        {person.leagues.length === 0 ? (
          <EmptyState title="No league yet" action={create}>
            Create the league you run: its first season and division take about five minutes. Do you belong to
            one already? Then ask its league admin to invite {person.email}.
          </EmptyState>
        ) : (
          <Table caption="The leagues you belong to" cards>
            <Thead>
              <Th>League</Th>
              <Th>Season</Th>
              <Th>Your roles</Th>
            </Thead>
            <Tbody>
              {person.leagues.map(({ league, actor }) => (
                <Tr key={league.id}>
                  <Td rowHead>
                    <TextLink href={paths.league(league.slug)}>{league.name}</TextLink>
                  </Td>
                  <Td label="Season">{league.currentSeason?.name ?? 'No season yet'}</Td>
                  <Td label="Your roles">{describeRoles(actor.roles)}</Td>
                </Tr>
              ))}
            </Tbody>
          </Table>
        )}
      </Card>
    </>
  );
}
