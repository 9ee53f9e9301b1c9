'use client';

import { useRouter } from 'next/navigation';
import { Button, ButtonLink, DownloadLink } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { PageHeader } from '@/components/ui/page-header';
import { useToast } from '@/components/ui/toast';
import { countOf } from '@/lib/domain/text/count-of';
import type { ReadinessList, ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import type { LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';

type Remind = LeagueAction<
  { season: string; teamIds: string[] },
  { teams: number; people: number; leftOut: number }
>;

/** The figures of the season and the two things to do with them: remind managers, make a batch. */
export function ReadinessHead({
  league,
  season,
  teams,
  may,
  onRemind,
}: {
  league: string;
  season: string;
  teams: ReadyTeam[];
  may: ReadinessList['may'];
  onRemind: Remind;
}) {
  const router = useRouter();
  const showToast = useToast();
  const count = (group: ReadyTeam['group']) => teams.filter((team) => team.group === group).length;
  const ready = teams.filter((team) => team.group === 'ready');
  const late = teams.filter(
    (team) => (team.group === 'collecting' || team.group === 'blocked') && team.managers.length > 0,
  );
  const managers = new Set(late.flatMap((team) => team.managerIds)).size;
  const players = teams.reduce((sum, team) => sum + team.players, 0);
  const figures = [
    count('in a batch') > 0 && `${count('in a batch')} in a batch`,
    `${ready.length} ready`,
    count('submitted') > 0 && `${count('submitted')} to sign off`,
    `${count('blocked')} blocked`,
    `${count('collecting')} still collecting`,
  ].filter((part) => part !== false);

  const remind = async () => {
    const answer = await onRemind(league, { season, teamIds: late.map((team) => team.id) });
    if (!answer.ok) return answer.error.message;
    const { people, leftOut } = answer.data;
    showToast({
      tone: 'set',
      title: `${countOf(people, 'manager')} will get an e-mail`,
      body: leftOut > 0 ? `${countOf(leftOut, 'team')} left out: reminded within a day.` : undefined,
    });
    router.refresh();
  };

  return (
    <PageHeader
      title="Readiness"
      subtitle={`${countOf(teams.length, 'team')}, ${countOf(players, 'player')}. ${figures.join(', ')}.`}
      actions={
        <>
          {teams.length > 0 && (
            <DownloadLink look="quiet" icon="download" href={paths.api.readinessCsv(league, season)}>
              CSV
            </DownloadLink>
          )}
          {may.remind && managers > 0 && (
            <ConfirmDialog
              title={`Remind ${countOf(managers, 'manager')}?`}
              confirm={`Send to ${countOf(managers, 'manager')}`}
              cancel="Not now"
              onConfirm={remind}
              trigger={<Button>Remind {countOf(managers, 'manager')}</Button>}
            >
              <p>Each gets an e-mail saying what holds their team, at most once a day for a team.</p>
              <ul className="border-hem mt-3 grid max-h-60 gap-1 overflow-y-auto border-t pt-2">
                {late.map((team) => (
                  <li key={team.id} className="flex flex-wrap justify-between gap-x-4">
                    <span className="font-[560]">{team.name}</span>
                    <span className="text-dusk">{team.managers.join(', ')}</span>
                  </li>
                ))}
              </ul>
            </ConfirmDialog>
          )}
          {may.batch && (
            <ButtonLink look="primary" href={paths.newBatch(league, season)}>
              {ready.length > 0 ? `Make a batch of ${countOf(ready.length, 'team')}` : 'Make a batch'}
            </ButtonLink>
          )}
        </>
      }
    />
  );
}
