import type { OutgoingTx } from '../tenant';

/** A letter of the outbox: `sentAt` and `failure` are null while it waits. `template` and `params` are as stored. */
export type QueuedEmail = {
  id: string;
  to: string;
  template: string;
  params: Record<string, string>;
  sentAt: Date | null;
  failure: string | null;
};

/** The letter this transaction is about, locked until it ends; undefined when it was never queued. */
export async function lockEmail(tx: OutgoingTx, emailId: string): Promise<QueuedEmail | undefined> {
  const row = await tx
    .selectFrom('emails')
    .select(['id', 'to_address', 'template', 'params', 'sent_at', 'failure'])
    .where('id', '=', emailId)
    .forUpdate()
    .executeTakeFirst();
  return (
    row && {
      id: row.id,
      to: row.to_address,
      template: row.template,
      params: row.params,
      sentAt: row.sent_at,
      failure: row.failure,
    }
  );
}

/** Notes that the mail server took the letter (`failure` null) or never will, and wipes the link it carried. */
export async function closeEmail(
  tx: OutgoingTx,
  emailId: string,
  end: { sentAt: Date; failure: null } | { sentAt: null; failure: string },
): Promise<void> {
  await tx
    .updateTable('emails')
    .set({ sent_at: end.sentAt, failure: end.failure, params: '{}' })
    .where('id', '=', emailId)
    .execute();
}
