'use client';

import { useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Dialog, DialogClose } from '@/components/ui/dialog';
import type { LeagueAction } from '@/lib/web/action-result';
import { TeamPicker, type TeamChoice } from './team-picker';

export type ChangeTeams = LeagueAction<
  { membershipId: string; teamIds: string[] },
  { added: string[]; removed: string[] }
>;

/** Names the teams of one manager anew. Mounted while it is open, so that it starts from the teams of now. */
export function ChangeTeamsDialog({
  league,
  manager,
  teams,
  changeTeams,
  onClose,
  onDone,
}: {
  league: string;
  manager: { id: string; name: string; teams: readonly { id: string }[] };
  teams: readonly TeamChoice[];
  changeTeams: ChangeTeams;
  onClose: () => void;
  onDone: () => void;
}) {
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set(manager.teams.map((team) => team.id)));
  const { submit, pending, failure, fields } = useSubmit(changeTeams, onDone);
  return (
    <Dialog
      title={`Teams of ${manager.name}`}
      description="They see the rosters of these teams and no others. New teams are told to them by e-mail."
      open
      onOpenChange={(next) => {
        if (!next) onClose();
      }}
      footer={
        <>
          <DialogClose>
            <Button>Cancel</Button>
          </DialogClose>
          <Button
            look="primary"
            pending={pending}
            onClick={() => void submit(league, { membershipId: manager.id, teamIds: [...chosen] })}
          >
            Save {chosen.size} {chosen.size === 1 ? 'team' : 'teams'}
          </Button>
        </>
      }
    >
      <div className="grid gap-4">
        <FormFailure failure={failure} />
        <TeamPicker teams={teams} chosen={chosen} onChange={setChosen} error={fields['teamIds']} />
      </div>
    </Dialog>
  );
}
