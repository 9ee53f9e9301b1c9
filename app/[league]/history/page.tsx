import type { Metadata } from 'next';
import { ButtonLink, DownloadLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { listEvents } from '@/lib/use-cases/history/list-events';
import { historyQuerySchema } from '@/lib/use-cases/history/history-schemas';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { EventList } from './_components/event-list';
import { HistoryFilters } from './_components/history-filters';
import { writeQuery } from './_components/write-query';

export const metadata: Metadata = { title: 'History' };

type Props = {
  params: Promise<{ league: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
};

export default async function HistoryPage({ params, searchParams }: Props) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.history(league));
  const query = historyQuerySchema.parse(await searchParams);
  const { lines, next } = await showNotFound(listEvents(ctx, query));
  const here = paths.history(league);
  const narrowed = query.kind !== null || query.search !== '';
  return (
    <>
      <PageHeader
        title="History"
        subtitle="What was done in this league, by whom and when. Nothing here is ever changed or removed."
        actions={
          <DownloadLink
            icon="download"
            href={`${paths.api.historyCsv(league)}${writeQuery({ ...query, before: null })}`}
          >
            Download {narrowed ? 'these' : 'all'} as CSV
          </DownloadLink>
        }
      />
      <Card flush>
        <HistoryFilters kind={query.kind} search={query.search} here={here} />
        {lines.length === 0 ? (
          <EmptyState
            title={narrowed ? 'Nothing in the history fits' : 'Nothing has happened yet'}
            action={narrowed && <ButtonLink href={here}>Show everything</ButtonLink>}
          >
            {narrowed && 'Try another kind, or fewer words.'}
          </EmptyState>
        ) : (
          <EventList lines={lines} timeZone={ctx.league.timeZone} year={ctx.now.getUTCFullYear()} />
        )}
        {(next !== null || query.before !== null) && (
          <nav
            aria-label="Pages of the history"
            className="border-hem flex justify-between gap-3 border-t px-4 py-3"
          >
            {query.before !== null ? (
              <ButtonLink href={`${here}${writeQuery({ ...query, before: null })}`}>
                Back to the newest
              </ButtonLink>
            ) : (
              <span />
            )}
            {next !== null && (
              <ButtonLink href={`${here}${writeQuery({ ...query, before: next })}`}>Older</ButtonLink>
            )}
          </nav>
        )}
      </Card>
    </>
  );
}
