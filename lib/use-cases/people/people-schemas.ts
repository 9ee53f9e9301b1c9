import { z } from 'zod';
import { roles } from '@/lib/domain/access/permissions';
import { emailSchema, nameSchema, passwordSchema, tokenSchema } from '../account/account-schemas';

const shopSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('existing'), id: z.uuid('Choose the shop.') }),
  z.object({
    kind: z.literal('new'),
    name: z.string().trim().min(1, 'Write the name of the shop.').max(120, 'Write at most 120 characters.'),
  }),
]);

export const invitePersonSchema = z
  .object({
    email: emailSchema,
    role: z.enum(roles, 'Choose a role.'),
    teamIds: z.array(z.uuid()).max(500).default([]),
    shop: shopSchema.nullable().default(null),
  })
  .superRefine(({ role, teamIds, shop }, context) => {
    const refuse = (path: string, message: string) =>
      context.addIssue({ code: 'custom', path: [path], message });
    if (role === 'team manager' && teamIds.length === 0) refuse('teamIds', 'Choose at least one team.');
    if (role !== 'team manager' && teamIds.length > 0)
      refuse('teamIds', 'Only a team manager is named for teams.');
    if (role === 'decorator' && shop === null) refuse('shop', 'Choose a shop, or name a new one.');
    if (role !== 'decorator' && shop !== null) refuse('shop', 'Only a decorator belongs to a shop.');
  });

export const invitationIdSchema = z.object({ invitationId: z.uuid() });
export const endMembershipSchema = z.object({ membershipId: z.uuid() });
export const changeManagerTeamsSchema = z.object({
  membershipId: z.uuid(),
  teamIds: z.array(z.uuid()).min(1, 'Choose at least one team, or end the membership instead.').max(500),
});
export const acceptInvitationSchema = z.object({ token: tokenSchema });
export const joinAsNewcomerSchema = z.object({
  token: tokenSchema,
  name: nameSchema,
  password: passwordSchema,
});
