import { z } from 'zod';
import { getEnv } from '@/lib/platform/env';
import { getLog } from '@/lib/platform/log';
import { notFound } from '@/lib/platform/errors';

const messagesSchema = z.array(
  z.object({
    id: z.string(),
    at: z.iso.datetime(),
    from: z.string(),
    to: z.array(z.string()),
    subject: z.string(),
    text: z.string(),
  }),
);
export type CaughtMessage = z.infer<typeof messagesSchema>[number];

/**
 * The letters that the demonstration's mail server has caught, newest first; null when it does not answer. Outside demo
 * mode there is no such page: letters are for those they are addressed to.
 */
export async function listInbox(): Promise<CaughtMessage[] | null> {
  const { RAGLAN_DEMO, MAIL_INBOX_URL } = getEnv();
  if (!RAGLAN_DEMO || MAIL_INBOX_URL === undefined) throw notFound('page');
  try {
    const answer = await fetch(`${MAIL_INBOX_URL}/messages`, {
      cache: 'no-store',
      signal: AbortSignal.timeout(3000),
    });
    return messagesSchema.parse(await answer.json());
  } catch (error) {
    getLog().warn({ err: error }, 'the demo inbox does not answer');
    return null;
  }
}
