import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { formatShortInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import { can } from '@/lib/domain/access/permissions';
import { listPeople } from '@/lib/use-cases/people/list-people';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { InviteDialog } from './_components/invite-dialog';
import { InvitationsCard } from './_components/invitations-card';
import { MembersCard } from './_components/members-card';
import { RolesCard } from './_components/roles-card';
import {
  changeManagerTeamsAction,
  endRoleAction,
  invitePersonAction,
  resendInvitationAction,
  revokeInvitationAction,
} from './actions';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.people(league));
  const people = await showNotFound(listPeople(ctx));
  const count = new Set(people.memberships.map((membership) => membership.userId)).size;
  const out = people.invitations.length;
  const mayManage = can(ctx.actor, 'people.manage');
  const choices = { teams: people.teams, shops: people.shops };
  return (
    <>
      <PageHeader
        title="People"
        subtitle={`${countOf(count, 'person', 'people')}${out > 0 ? `, ${countOf(out, 'invitation')} out` : ''}`}
        actions={mayManage && <InviteDialog league={league} choices={choices} invite={invitePersonAction} />}
      />
      <div className="grid gap-5">
        {out > 0 && (
          <InvitationsCard
            league={league}
            invitations={people.invitations.map((invitation) => ({
              ...invitation,
              until: formatShortInstant(invitation.expiresAt, ctx.league.timeZone),
            }))}
            resend={resendInvitationAction}
            revoke={revokeInvitationAction}
          />
        )}
        <MembersCard
          league={league}
          me={ctx.actor.userId}
          members={people.memberships.map((membership) => ({
            ...membership,
            last: membership.role === 'league admin' && people.admins === 1,
          }))}
          teams={people.teams}
          changeTeams={changeManagerTeamsAction}
          end={endRoleAction}
        />
        <RolesCard />
      </div>
    </>
  );
}
