'use server';

import { changeManagerTeams } from '@/lib/use-cases/people/change-manager-teams';
import { endRole } from '@/lib/use-cases/people/end-role';
import { invitePerson } from '@/lib/use-cases/people/invite-person';
import {
  changeManagerTeamsSchema,
  endMembershipSchema,
  invitationIdSchema,
  invitePersonSchema,
} from '@/lib/use-cases/people/people-schemas';
import { resendInvitation } from '@/lib/use-cases/people/resend-invitation';
import { revokeInvitation } from '@/lib/use-cases/people/revoke-invitation';
import { leagueAction } from '@/lib/web/action';

export const invitePersonAction = leagueAction(invitePersonSchema, invitePerson);
export const resendInvitationAction = leagueAction(invitationIdSchema, resendInvitation);
export const revokeInvitationAction = leagueAction(invitationIdSchema, revokeInvitation);
export const endRoleAction = leagueAction(endMembershipSchema, endRole);
export const changeManagerTeamsAction = leagueAction(changeManagerTeamsSchema, changeManagerTeams);
