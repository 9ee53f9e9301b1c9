'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { readText, useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Dialog, DialogClose } from '@/components/ui/dialog';
import { SelectField, TextField } from '@/components/ui/field';
import { RadioGroup } from '@/components/ui/radio-group';
import { useToast } from '@/components/ui/toast';
import type { Role } from '@/lib/domain/access/permissions';
import type { LeagueAction } from '@/lib/web/action-result';
import { TeamPicker, type TeamChoice } from './team-picker';

type Input = {
  email: string;
  role: Role;
  teamIds: string[];
  shop: { kind: 'existing'; id: string } | { kind: 'new'; name: string } | null;
};
type Invited = { outcome: 'invited' | 'sent again' | 'teams added'; email: string };

const newShop = 'new';
const roleOptions: { value: Role; label: string; hint: string }[] = [
  { value: 'team manager', label: 'Team manager', hint: 'Fills and submits the rosters of named teams' },
  { value: 'league admin', label: 'League admin', hint: 'Runs the league with you, and may invite others' },
  { value: 'decorator', label: 'Decorator', hint: 'Takes the batches released to one shop' },
  { value: 'referee', label: 'Referee', hint: 'Compares two teams before a match' },
];

/** Invites an address to a role; what was typed stays until the invitation is out. */
export function InviteDialog({
  league,
  choices,
  invite,
}: {
  league: string;
  choices: { teams: readonly TeamChoice[]; shops: readonly { id: string; name: string }[] };
  invite: LeagueAction<Input, Invited>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [open, setOpen] = useState(false);
  const [role, setRole] = useState<Role>('team manager');
  const [teams, setTeams] = useState<ReadonlySet<string>>(new Set());
  const [shop, setShop] = useState(choices.shops[0]?.id ?? newShop);
  const { submit, pending, failure, fields, forget } = useSubmit(invite, ({ outcome, email }) => {
    const title = {
      invited: `Invited ${email}`,
      'sent again': `Sent the invitation to ${email} again`,
      'teams added': `Added the teams to ${email}, who is here already`,
    }[outcome];
    showToast({ tone: 'set', title });
    setTeams(new Set());
    setOpen(false);
    router.refresh();
  });

  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    void submit(league, {
      email: readText(form, 'email'),
      role,
      teamIds: role === 'team manager' ? [...teams] : [],
      shop:
        role !== 'decorator'
          ? null
          : shop === newShop
            ? { kind: 'new', name: readText(form, 'shopName') }
            : { kind: 'existing', id: shop },
    });
  };

  return (
    <Dialog
      title="Invite somebody"
      description="They get a letter with a link that works once, for 14 days."
      open={open}
      onOpenChange={(next) => {
        setOpen(next);
        if (!next) forget();
      }}
      trigger={
        <Button look="primary" icon="mail">
          Invite somebody
        </Button>
      }
      footer={
        <>
          <DialogClose>
            <Button>Cancel</Button>
          </DialogClose>
          <Button look="primary" type="submit" form="invite" pending={pending}>
            Send the invitation
          </Button>
        </>
      }
    >
      <form id="invite" method="post" onSubmit={send} className="grid gap-4">
        <FormFailure failure={failure} />
        <TextField
          label="E-mail address"
          name="email"
          type="email"
          inputMode="email"
          autoComplete="off"
          required
          maxLength={254}
          error={fields['email']}
        />
        <RadioGroup
          legend="Role"
          name="role"
          options={roleOptions}
          value={role}
          onChange={(value) => setRole(roleOptions.find((option) => option.value === value)?.value ?? role)}
          error={fields['role']}
        />
        {role === 'team manager' && (
          <TeamPicker teams={choices.teams} chosen={teams} onChange={setTeams} error={fields['teamIds']} />
        )}
        {role === 'decorator' && (
          <>
            <SelectField
              label="Shop"
              value={shop}
              onChange={(event) => setShop(event.target.value)}
              options={[
                ...choices.shops.map((entry) => ({ value: entry.id, label: entry.name })),
                { value: newShop, label: 'A shop that is new here' },
              ]}
              error={fields['shop'] ?? fields['shop.id']}
            />
            {shop === newShop && (
              <TextField
                label="Name of the shop"
                name="shopName"
                required
                maxLength={120}
                error={fields['shop.name']}
              />
            )}
          </>
        )}
      </form>
    </Dialog>
  );
}
