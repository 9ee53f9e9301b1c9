import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { StatusTag } from '@/components/ui/tag';
import { TextLink } from '@/components/ui/text-link';
import { formatDay, formatInstant } from '@/lib/domain/dates/format';
import { toDay } from '@/lib/domain/dates/zone';
import { countOf } from '@/lib/domain/text/count-of';
import { listSeasons } from '@/lib/use-cases/seasons/list-seasons';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { MakeCurrentButton } from './_components/make-current-button';
import { chooseCurrentSeasonAction } from './actions';

export const metadata: Metadata = { title: 'Seasons' };

export default async function SeasonsPage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.seasons(league));
  const seasons = await showNotFound(listSeasons(ctx));
  const year = Number(toDay(ctx.now, ctx.league.timeZone).slice(0, 4));
  const open = (
    <ButtonLink look="primary" href={paths.newSeason(league)}>
      Open a season
    </ButtonLink>
  );
  return (
    <>
      <PageHeader
        title="Seasons"
        subtitle={`${countOf(seasons.length, 'season')}. People of the league land in the current one.`}
        actions={seasons.length > 0 && open}
      />
      <Card flush>
        {seasons.length === 0 ? (
          <EmptyState title="No season yet" action={open}>
            A season holds divisions, teams and dates. Open the first one to begin.
          </EmptyState>
        ) : (
          <Table caption="Seasons" cards>
            <Thead>
              <Th>Season</Th>
              <Th>Sport</Th>
              <Th end>Divisions</Th>
              <Th end>Teams</Th>
              <Th>Rosters freeze</Th>
              <Th>First match</Th>
              <Th>
                <span className="sr-only">Current</span>
              </Th>
            </Thead>
            <Tbody>
              {seasons.map((season) => (
                <Tr key={season.id}>
                  <Td rowHead>
                    <TextLink href={paths.dates(league, season.slug)}>{season.name}</TextLink>
                  </Td>
                  <Td label="Sport">{season.sport}</Td>
                  <Td label="Divisions" end>
                    {season.divisions}
                  </Td>
                  <Td label="Teams" end>
                    {season.teams}
                  </Td>
                  <Td label="Rosters freeze">{formatInstant(season.freezesAt, ctx.league.timeZone, year)}</Td>
                  <Td label="First match">{formatDay(season.firstMatchOn, year)}</Td>
                  <Td label="">
                    {season.isCurrent ? (
                      <StatusTag tone="set">current</StatusTag>
                    ) : (
                      <MakeCurrentButton
                        league={league}
                        season={{ id: season.id, name: season.name }}
                        onChoose={chooseCurrentSeasonAction}
                      />
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
