import { closeEmail, lockEmail } from '@/db/queries/emails';
import { withOutgoing } from '@/db/tenant';
import { outgoingEmailSchema } from '@/lib/domain/league/email';
import { writeEmail } from '@/lib/platform/mail/templates';
import { deliverEmail } from '@/lib/platform/mail/transport';
import type { RequestContext } from '../context';

export type SendOutcome = 'sent' | 'refused' | 'closed already' | 'unknown';

/**
 * Sends one letter of the outbox. The row stays locked while the mail server is spoken to, so that two workers with
 * the same job send one message; what may pass is thrown and leaves the letter as it was.
 */
export async function sendEmail(ctx: RequestContext, input: { emailId: string }): Promise<SendOutcome> {
  return withOutgoing(input.emailId, async (tx) => {
    const email = await lockEmail(tx, input.emailId);
    if (!email) return 'unknown';
    if (email.sentAt !== null || email.failure !== null) return 'closed already';
    const letter = outgoingEmailSchema.parse({ template: email.template, params: email.params });
    const delivery = await deliverEmail({ id: email.id, to: email.to, ...writeEmail(letter) });
    if (delivery.outcome === 'refused') {
      await closeEmail(tx, email.id, { sentAt: null, failure: delivery.because });
      return 'refused';
    }
    await closeEmail(tx, email.id, { sentAt: ctx.now, failure: null });
    return 'sent';
  });
}

/** Gives a letter up after the last try, so that the link in it is not kept for nobody. */
export async function giveEmailUp(input: { emailId: string; because: string }): Promise<void> {
  await withOutgoing(input.emailId, async (tx) => {
    const email = await lockEmail(tx, input.emailId);
    if (!email || email.sentAt !== null || email.failure !== null) return;
    await closeEmail(tx, email.id, { sentAt: null, failure: input.because });
  });
}
