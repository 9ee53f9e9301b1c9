import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { StatusText } from '@/components/ui/tag';
import { TextLink } from '@/components/ui/text-link';
import { formatShortInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import { listDivisions } from '@/lib/use-cases/divisions/list-divisions';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';

export const metadata: Metadata = { title: 'Divisions' };

export default async function DivisionsPage({
  params,
}: {
  params: Promise<{ league: string; season: string }>;
}) {
  const { league, season } = await params;
  const { ctx } = await requireLeague(league, paths.divisions(league, season));
  const { divisions, mayChange } = await showNotFound(listDivisions(ctx, { season }));
  const teams = divisions.reduce((sum, division) => sum + division.teams, 0);
  const add = mayChange && (
    <ButtonLink look="primary" href={paths.newDivision(league, season)}>
      Add a division
    </ButtonLink>
  );
  return (
    <>
      <PageHeader
        title="Divisions"
        subtitle={`${countOf(divisions.length, 'division')}, ${countOf(teams, 'team')}.`}
        actions={divisions.length > 0 && add}
      />
      <Card flush>
        {divisions.length === 0 ? (
          <EmptyState title="No divisions yet" action={add}>
            A division says who plays in it, by which number rules, and in which garments. Teams come next.
          </EmptyState>
        ) : (
          <Table caption="Divisions of this season" cards>
            <Thead>
              <Th>Division</Th>
              <Th>Age band</Th>
              <Th end>Teams</Th>
              <Th end>Players</Th>
              <Th>Roster</Th>
              <Th>Number rules</Th>
              <Th>Garments</Th>
              <Th>Freezes</Th>
            </Thead>
            <Tbody>
              {divisions.map((division) => (
                <Tr key={division.id}>
                  <Td rowHead>
                    {mayChange ? (
                      <TextLink href={paths.division(league, season, division.slug)}>
                        {division.name}
                      </TextLink>
                    ) : (
                      <span className="font-[560]">{division.name}</span>
                    )}
                    {division.level !== '' && (
                      <span className="type-fine text-dusk block">{division.level}</span>
                    )}
                  </Td>
                  <Td label="Age band">{division.ageBand || '–'}</Td>
                  <Td label="Teams" end>
                    {division.teams}
                  </Td>
                  <Td label="Players" end>
                    {division.players}
                  </Td>
                  <Td label="Roster">
                    {division.leastPlayers}–{division.mostPlayers} players
                  </Td>
                  <Td label="Number rules">
                    <TextLink href={paths.numberRuleSet(league, division.ruleSetId)}>
                      {division.ruleSetName}
                    </TextLink>
                    {division.rules === null && (
                      <span className="block">
                        <StatusText tone="care">not in force yet</StatusText>
                      </span>
                    )}
                  </Td>
                  <Td label="Garments">
                    {division.garments.map((garment) => garment.name).join(', ') || '–'}
                  </Td>
                  <Td label="Freezes">
                    {formatShortInstant(division.freezesAt, ctx.league.timeZone)}
                    {division.ownFreezesAt === null && (
                      <span className="type-fine text-dusk block">with the season</span>
                    )}
                  </Td>
                </Tr>
              ))}
            </Tbody>
          </Table>
        )}
      </Card>
    </>
  );
}
