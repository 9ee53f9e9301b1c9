import { z } from 'zod';

const text = z.string();
const letter = <T extends string, P extends z.ZodRawShape>(template: T, params: P) =>
  z.object({ template: z.literal(template), params: z.object(params) });

/**
 * Every e-mail the product sends, with what it needs to be written; the text itself is in lib/platform/mail. All
 * parameters are words for a person: dates are written out in the league's time zone, lists are joined.
 */
export const outgoingEmailSchema = z.discriminatedUnion('template', [
  /** `teams` is the list of a manager's teams, or empty. */
  letter('invitation', {
    league: text,
    role: text,
    teams: text,
    invitedBy: text,
    link: text,
    expires: text,
  }),
  letter('teams-added', { league: text, teams: text, addedBy: text, link: text }),
  letter('sign-up', { link: text, expires: text }),
  /** For somebody who asks for an account and has one: only the owner of the address learns it. */
  letter('sign-up-known', { signInLink: text, resetLink: text }),
  letter('password-reset', { link: text, expires: text }),
  letter('password-changed', { resetLink: text }),
  letter('roster-reminder', { league: text, team: text, freezes: text, holds: text, link: text }),
  letter('roster-returned', { league: text, team: text, reason: text, link: text }),
  letter('roster-signed-off', { league: text, team: text, link: text }),
  letter('batch-released', { league: text, batch: text, teams: text, link: text }),
]);
export type OutgoingEmail = z.infer<typeof outgoingEmailSchema>;
