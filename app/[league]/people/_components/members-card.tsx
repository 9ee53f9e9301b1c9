'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { Card } from '@/components/ui/card';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { FilterChips } from '@/components/ui/filter-chips';
import { IconButton } from '@/components/ui/icon-button';
import { Menu } from '@/components/ui/menu';
import { useToast } from '@/components/ui/toast';
import { roles, type Role } from '@/lib/domain/access/permissions';
import type { LeagueAction } from '@/lib/web/action-result';
import { capitalise } from '@/lib/domain/text/sentence';
import { ChangeTeamsDialog, type ChangeTeams } from './change-teams-dialog';
import { describePlace } from './describe-place';
import type { TeamChoice } from './team-picker';

type Member = {
  id: string;
  userId: string;
  name: string;
  email: string;
  role: Role;
  shop: { name: string } | null;
  teams: { id: string; name: string }[];
  /** The only league admin: stays until there is another. */
  last: boolean;
};

const columns: DataColumn<Member>[] = [
  {
    id: 'person',
    header: 'Person',
    rowHead: true,
    cell: (row) => (
      <div className="min-w-0 text-left max-sm:pr-12">
        <span className="block font-[560]">{row.name}</span>
        <span className="type-small text-dusk block break-all">{row.email}</span>
      </div>
    ),
    sortValue: (row) => row.name,
    searchText: (row) => `${row.name} ${row.email}`,
  },
  {
    id: 'role',
    header: 'Role',
    cell: (row) => capitalise(row.role),
    sortValue: (row) => roles.indexOf(row.role),
    searchText: (row) => row.role,
  },
  { id: 'place', header: 'For', cell: describePlace, sortValue: describePlace, searchText: describePlace },
];

/** Everybody of the league, a line for each role they hold. */
export function MembersCard({
  league,
  me,
  members,
  teams,
  changeTeams,
  end,
}: {
  league: string;
  me: string;
  members: readonly Member[];
  teams: readonly TeamChoice[];
  changeTeams: ChangeTeams;
  end: LeagueAction<{ membershipId: string }, { person: string; role: string }>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [role, setRole] = useState<Role | 'all'>('all');
  const [changing, setChanging] = useState<Member>();
  const [ending, setEnding] = useState<Member>();
  const rows = useMemo(
    () => members.filter((member) => role === 'all' || member.role === role),
    [members, role],
  );
  const chips = [
    { id: 'all' as const, label: 'All', count: members.length },
    ...roles.map((id) => ({
      id,
      label: `${capitalise(id)}s`,
      count: members.filter((member) => member.role === id).length,
    })),
  ];

  const endMembership = async (member: Member) => {
    const result = await end(league, { membershipId: member.id });
    if (!result.ok) return result.error.message;
    showToast({ tone: 'set', title: `${result.data.person} is no longer ${result.data.role}` });
    router.refresh();
  };

  return (
    <Card flush title="Who belongs to the league">
      <DataTable
        caption="Everybody of the league and their roles"
        rows={rows}
        columns={columns}
        getRowId={(row) => row.id}
        searchLabel="Find a person or team"
        toolbar={<FilterChips label="Roles" chips={chips} chosen={role} onChoose={setRole} />}
        onClearFilters={() => setRole('all')}
        initialSort={{ id: 'person' }}
        empty={<EmptyState title="Nobody is here yet" />}
        rowActions={(row) => (
          <Menu
            trigger={<IconButton icon="more" label={`More for ${row.name}, ${row.role}`} />}
            groups={[
              {
                items: [
                  ...(row.role === 'team manager'
                    ? [{ label: 'Change teams', icon: 'edit' as const, onSelect: () => setChanging(row) }]
                    : []),
                  {
                    label: 'End this membership',
                    hint: row.last ? 'The only league admin. Invite another one first.' : undefined,
                    icon: 'bin' as const,
                    danger: true,
                    disabled: row.last,
                    onSelect: () => setEnding(row),
                  },
                ],
              },
            ]}
          />
        )}
      />
      {changing && (
        <ChangeTeamsDialog
          league={league}
          manager={changing}
          teams={teams}
          changeTeams={changeTeams}
          onClose={() => setChanging(undefined)}
          onDone={() => {
            showToast({ tone: 'set', title: `Saved the teams of ${changing.name}` });
            setChanging(undefined);
            router.refresh();
          }}
        />
      )}
      {ending && (
        <ConfirmDialog
          open
          onOpenChange={(next) => {
            if (!next) setEnding(undefined);
          }}
          title={`End ${ending.userId === me ? 'your own' : `${ending.name}’s`} membership as ${ending.role}?`}
          confirm="End the membership"
          onConfirm={() => endMembership(ending)}
        >
          <WhatIsLost member={ending} own={ending.userId === me} />
        </ConfirmDialog>
      )}
    </Card>
  );
}

function WhatIsLost({ member, own }: { member: Member; own: boolean }) {
  const who = own ? 'You' : member.name;
  const sees = {
    'league admin': 'run this league or see its records',
    'team manager': `see or fill the rosters of ${describePlace(member)}`,
    decorator: `see the batches of ${describePlace(member)}`,
    referee: 'compare the teams of this league',
  }[member.role];
  return (
    <p>
      {who} can no longer {sees}, and {own ? 'are' : 'is'} signed out on every device. Rosters, batches and
      the history stay as they are. To come back, {own ? 'you need' : 'they need'} a new invitation.
    </p>
  );
}
