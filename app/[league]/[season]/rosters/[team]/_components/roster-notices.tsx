'use client';

import { Button } from '@/components/ui/button';
import { IconButton } from '@/components/ui/icon-button';
import { Notice } from '@/components/ui/notice';
import { TextLink } from '@/components/ui/text-link';
import { formatInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import type { RosterPage } from '@/lib/use-cases/rosters/get-roster';
import { paths } from '@/lib/web/paths';
import type { SessionSnapshot } from './roster-session';

/** What must be known before the list is read: where the roster stands, who put it there, and work that was found again. */
export function RosterNotices({
  league,
  timeZone,
  roster,
  restored,
  leftovers,
  unsaved,
  onDismiss,
  onDiscard,
}: {
  league: string;
  timeZone: string;
  roster: RosterPage;
  restored: SessionSnapshot['restored'];
  leftovers: SessionSnapshot['leftovers'];
  unsaved: number;
  onDismiss: () => void;
  onDiscard: () => void;
}) {
  const when = (at: Date | number) => formatInstant(new Date(at), timeZone);
  const standing = describeStanding(roster, when);
  return (
    <div className="mb-4 grid gap-3 empty:hidden">
      {roster.rules === null && (
        <Notice
          tone="stop"
          title={`No number rules are in force for ${roster.division.name}`}
          action={
            roster.may.changeRules && <TextLink href={paths.numberRules(league)}>Number rules</TextLink>
          }
        >
          Players can be entered, but nothing is checked, and the roster can’t be submitted until{' '}
          {roster.may.changeRules ? 'rules are put in force.' : 'a league admin puts rules in force.'}
        </Notice>
      )}
      {standing !== null && (
        <Notice tone={standing.tone} title={standing.title}>
          {standing.body}
        </Notice>
      )}
      {restored !== null && (
        <Notice
          tone="note"
          live="polite"
          title={`${countOf(restored.count, 'change')} from ${when(restored.at)} put back`}
          action={
            <IconButton
              icon="close"
              label="Put this notice away"
              onClick={onDismiss}
              className="-my-1.5 -mr-2"
            />
          }
        >
          Kept on this device because {restored.count === 1 ? 'it' : 'they'} had not been saved.{' '}
          {unsaved > 0 ? 'Being saved now.' : 'Saved now.'}
        </Notice>
      )}
      {leftovers !== null && (
        <Notice
          tone="care"
          live="polite"
          title={`${countOf(leftovers.count, 'change')} typed here ${leftovers.count === 1 ? 'was' : 'were'} not saved`}
          action={
            <Button size="sm" onClick={onDiscard}>
              Let them go
            </Button>
          }
        >
          The roster was closed to edits before they reached the server ({when(leftovers.at)}). They are kept
          on this device, and are put back when the roster is open again.
        </Notice>
      )}
    </div>
  );
}

type Standing = { tone: 'note' | 'care' | 'set'; title: string; body: string };

function describeStanding(roster: RosterPage, when: (at: Date) => string): Standing | null {
  const by = (name: string | null | undefined) => (name ? ` by ${name}` : '');
  switch (roster.state) {
    case 'open':
      return roster.returnReason === null
        ? null
        : { tone: 'care', title: 'Reopened by the league', body: roster.returnReason };
    case 'returned':
      return {
        tone: 'care',
        title: `Returned${by(roster.updated.by)}`,
        body: roster.returnReason ?? '',
      };
    case 'submitted':
      return {
        tone: 'note',
        title: `Submitted${by(roster.submitted?.by)}`,
        body: `${roster.submitted ? `${when(roster.submitted.at)}. ` : ''}It waits for the league’s sign-off, and can’t be edited meanwhile.`,
      };
    case 'signed off':
    case 'frozen': {
      const batch =
        roster.batch === null ? '' : ` It is in batch ${roster.batch.code}, ${roster.batch.state}.`;
      const signed = roster.signedOff ? `${when(roster.signedOff.at)}. ` : '';
      return {
        tone: 'set',
        title: `Signed off${by(roster.signedOff?.by)}${roster.state === 'frozen' ? ', and frozen' : ''}`,
        body: `${signed}Names, numbers and sizes go to the decorator as they stand.${batch}`,
      };
    }
  }
}
