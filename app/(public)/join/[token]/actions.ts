'use server';

import { acceptInvitation } from '@/lib/use-cases/people/accept-invitation';
import { joinAsNewcomer } from '@/lib/use-cases/people/join-as-newcomer';
import { acceptInvitationSchema, joinAsNewcomerSchema } from '@/lib/use-cases/people/people-schemas';
import { personAction, publicAction } from '@/lib/web/action';

export const acceptInvitationAction = personAction(acceptInvitationSchema, acceptInvitation);
export const joinAsNewcomerAction = publicAction(joinAsNewcomerSchema, joinAsNewcomer);
