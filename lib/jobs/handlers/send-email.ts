import type { JobHelpers } from 'graphile-worker';
import { z } from 'zod';
import { readClock } from '@/lib/platform/clock';
import { newId } from '@/lib/platform/ids';
import { getLog } from '@/lib/platform/log';
import { giveEmailUp, sendEmail } from '@/lib/use-cases/mail/send-email';

const payloadSchema = z.object({ emailId: z.uuid() });

/** Sends one letter of the outbox; after the last try it is given up and the log says so. */
export async function handleSendEmail(payload: unknown, helpers: Pick<JobHelpers, 'job'>): Promise<void> {
  const input = payloadSchema.parse(payload);
  const ctx = { now: readClock(), requestId: newId(), newId };
  const about = { emailId: input.emailId, requestId: ctx.requestId };
  try {
    const outcome = await sendEmail(ctx, input);
    if (outcome === 'refused') getLog().warn(about, 'e-mail refused for good');
    else getLog().info({ ...about, outcome }, 'e-mail');
  } catch (error) {
    const last = helpers.job.attempts >= helpers.job.max_attempts;
    // The server's own words may name the recipient; the code is enough to act on.
    const code = error instanceof Error && 'code' in error ? error.code : undefined;
    getLog().error(
      { ...about, code, kind: error instanceof Error ? error.name : typeof error, last },
      'e-mail not sent',
    );
    if (last) await giveEmailUp({ ...input, because: 'the mail server could not be reached in time' });
    throw error;
  }
}
