'use client';

import { useState } from 'react';
import { RosterStateTag } from '@/components/status/roster-state-tag';
import { Button, ButtonLink } from '@/components/ui/button';
import { IconButton } from '@/components/ui/icon-button';
import { Menu, type MenuItem } from '@/components/ui/menu';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { useToast } from '@/components/ui/toast';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { formatInstant } from '@/lib/domain/dates/format';
import { isRosterEditable, judgeRosterStep, type RosterStep } from '@/lib/domain/roster/roster-state';
import { countOf } from '@/lib/domain/text/count-of';
import type { RosterPage } from '@/lib/use-cases/rosters/get-roster';
import type { LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';
import { ReasonDialog } from './reason-dialog';

type StepInput = { rosterId: string; revision: number };
type Step<I> = LeagueAction<I, unknown>;
export type RosterSteps = {
  submit: Step<StepInput>;
  withdraw: Step<StepInput>;
  return: Step<StepInput & { reason: string }>;
  signOff: Step<StepInput>;
  reopen: Step<StepInput & { reason: string }>;
  freeze: Step<StepInput>;
};

const lost = 'That did not reach the server. Nothing was changed. Check the connection and try again.';

/**
 * The team, how many players it has and when the roster freezes, and what can be done next. Props: `prepare` saves what
 * is still here and answers the revision to act on, or a sentence why not; `blockers` of the check as it stands.
 */
export function RosterHead({
  league,
  timeZone,
  today,
  roster,
  players,
  number,
  blockers,
  conflicts,
  steps,
  prepare,
}: {
  league: string;
  timeZone: string;
  today: Date;
  roster: RosterPage;
  players: number;
  number: string;
  blockers: number;
  conflicts: number;
  steps: RosterSteps;
  prepare: () => Promise<number | string>;
}) {
  const showToast = useToast();
  const [pending, setPending] = useState<RosterStep | null>(null);
  const [asking, setAsking] = useState<'return' | 'reopen' | null>(null);
  const { division, season, team, may, state } = roster;

  const judge = (step: RosterStep) =>
    judgeRosterStep(step, { state, blockers, players, heldByBatch: roster.batch?.code ?? null });
  const reasonAgainst = (step: RosterStep): string | undefined => {
    if (roster.rules === null) return `No number rules are in force for ${division.name} yet.`;
    if (conflicts > 0) return 'Choose first which value stays where two people changed the same cell.';
    const verdict = judge(step);
    return verdict.allowed ? undefined : verdict.reason;
  };

  /** Saves what waits, takes the step, and answers what went wrong. */
  const take = async <I,>(step: RosterStep, run: Step<StepInput & I>, more: I, done: string) => {
    if (pending !== null) return 'Another step is still on its way. Wait a moment, then try again.';
    setPending(step);
    try {
      const revision = await prepare();
      if (typeof revision === 'string') return revision;
      const answer = await run(league, { rosterId: roster.id, revision, ...more });
      if (!answer.ok) return answer.error.message;
      showToast({ tone: 'set', title: done });
      return undefined;
    } catch {
      return lost;
    } finally {
      setPending(null);
    }
  };
  const press = async (step: RosterStep, run: Step<StepInput>, done: string) => {
    const problem = await take(step, run, {}, done);
    if (problem !== undefined) showToast({ tone: 'stop', title: problem });
  };

  const more: MenuItem[] = [
    { label: 'Print the list', icon: 'print', onSelect: () => window.print() },
    {
      label: 'Download as CSV',
      icon: 'download',
      // A file, not a page: the router must not follow it.
      onSelect: () => window.location.assign(paths.api.rosterCsv(league, roster.id)),
    },
    ...(may.signOff && state === 'signed off'
      ? [
          {
            label: 'Freeze now',
            hint: `else it freezes with its date`,
            onSelect: () => void press('freeze', steps.freeze, `${team.name} is frozen`),
          },
        ]
      : []),
    ...(may.return && state === 'signed off'
      ? [{ label: 'Return with a reason', onSelect: () => setAsking('return') }]
      : []),
    ...(may.signOff && (state === 'signed off' || state === 'frozen')
      ? [{ label: 'Reopen with a reason', danger: true, onSelect: () => setAsking('reopen') }]
      : []),
  ];

  return (
    <>
      <PageHeader
        back={<BackLink href={paths.rosters(league, season.slug)}>Rosters</BackLink>}
        picture={<YokeTile kit={team.kits.home} number={number} size="lg" />}
        title={
          state === 'open' ? (
            team.name
          ) : (
            <span className="inline-flex flex-wrap items-center gap-x-3 gap-y-1">
              <span className="min-w-0 break-words">{team.name}</span>
              <RosterStateTag state={state} />
            </span>
          )
        }
        subtitle={`${division.name}, ${players} of ${division.leastPlayers}–${division.mostPlayers} players, ${describeFreeze(
          roster,
          today,
          timeZone,
        )}`}
        actions={
          <>
            {may.edit && isRosterEditable(state) && (
              <ButtonLink href={paths.uploadRoster(league, season.slug, team.slug)}>
                Add from a file
              </ButtonLink>
            )}
            {may.submit && state === 'submitted' && (
              <Button
                pending={pending === 'withdraw'}
                onClick={() => void press('withdraw', steps.withdraw, `${team.name} can be edited again`)}
              >
                Take it back
              </Button>
            )}
            {may.return && state === 'submitted' && (
              <Button pending={pending === 'return'} onClick={() => setAsking('return')}>
                Return with a reason
              </Button>
            )}
            {may.submit && isRosterEditable(state) && (
              <Button
                look="primary"
                pending={pending === 'submit'}
                unavailable={reasonAgainst('submit')}
                onClick={() =>
                  void press(
                    'submit',
                    steps.submit,
                    `${team.name} submitted with ${countOf(players, 'player')}. It can be taken back until it is signed off.`,
                  )
                }
              >
                Submit roster
              </Button>
            )}
            {may.signOff && state === 'submitted' && (
              <Button
                look="primary"
                pending={pending === 'sign off'}
                unavailable={reasonAgainst('sign off')}
                onClick={() =>
                  void press(
                    'sign off',
                    steps.signOff,
                    `${team.name} is signed off with ${countOf(players, 'player')}`,
                  )
                }
              >
                Sign off
              </Button>
            )}
            <Menu
              trigger={
                <IconButton
                  icon="more"
                  label="More for this roster"
                  className="border-thread bg-card text-ink border max-sm:grow-0!"
                />
              }
              groups={[{ items: more }]}
            />
          </>
        }
      />
      <ReasonDialog
        open={asking === 'return'}
        onOpenChange={(open) => setAsking(open ? 'return' : null)}
        title={`Return the roster of ${team.name}?`}
        label="What should be put right"
        hint="The managers get it by e-mail, and it stands on this page until they submit again."
        confirm="Return the roster"
        onConfirm={(reason) => take('return', steps.return, { reason }, `${team.name} is returned`)}
      >
        The managers can edit it again.{state === 'signed off' && ' The sign-off is undone.'}
      </ReasonDialog>
      <ReasonDialog
        open={asking === 'reopen'}
        onOpenChange={(open) => setAsking(open ? 'reopen' : null)}
        title={`Reopen the roster of ${team.name}?`}
        label="Why it is reopened"
        hint="It stands on this page and in the history."
        confirm="Reopen the roster"
        onConfirm={(reason) => take('reopen', steps.reopen, { reason }, `${team.name} is open again`)}
      >
        The sign-off{state === 'frozen' && ' and the freeze'} of {countOf(players, 'player')} is undone, and
        the roster must be submitted and signed off anew.
      </ReasonDialog>
    </>
  );
}

function describeFreeze(roster: RosterPage, today: Date, timeZone: string): string {
  const { frozenAt, division } = roster;
  const year = today.getUTCFullYear();
  if (frozenAt !== null) return `frozen since ${formatInstant(frozenAt, timeZone, year)}`;
  const verb = division.freezesAt.getTime() > today.getTime() ? 'freezes' : 'froze';
  return `${verb} ${formatInstant(division.freezesAt, timeZone, year)}`;
}
