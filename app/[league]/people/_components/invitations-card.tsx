'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { Notice } from '@/components/ui/notice';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { StatusTag } from '@/components/ui/tag';
import { useToast } from '@/components/ui/toast';
import type { LeagueAction } from '@/lib/web/action-result';
import { capitalise } from '@/lib/domain/text/sentence';
import { describePlace } from './describe-place';

type Row = {
  id: string;
  email: string;
  role: string;
  shop: { name: string } | null;
  teams: readonly { name: string }[];
  invitedBy: string;
  until: string;
  expired: boolean;
};
type Act = LeagueAction<{ invitationId: string }, { email: string }>;

/** The invitations nobody has accepted yet: send again, or withdraw. */
export function InvitationsCard({
  league,
  invitations,
  resend,
  revoke,
}: {
  league: string;
  invitations: readonly Row[];
  resend: Act;
  revoke: Act;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [busy, setBusy] = useState<string>();
  const again = useSubmit(resend, ({ email }) => {
    showToast({ tone: 'set', title: `Sent the invitation to ${email} again` });
    router.refresh();
  });

  const sendAgain = async (id: string) => {
    setBusy(id);
    await again.submit(league, { invitationId: id });
    setBusy(undefined);
  };
  const withdraw = async (row: Row) => {
    const result = await revoke(league, { invitationId: row.id });
    if (!result.ok) return result.error.message;
    showToast({ tone: 'set', title: `Withdrew the invitation to ${result.data.email}` });
    router.refresh();
  };

  return (
    <Card title="Invitations out" flush>
      {again.failure && (
        <Notice tone="stop" live="assertive" flush>
          {again.failure.message}
        </Notice>
      )}
      <Table caption="Invitations that nobody has accepted yet" cards>
        <Thead>
          <Th>Address</Th>
          <Th>Role</Th>
          <Th>For</Th>
          <Th>Invited by</Th>
          <Th>Open</Th>
          <Th srOnly>What to do</Th>
        </Thead>
        <Tbody>
          {invitations.map((row) => (
            <Tr key={row.id}>
              <Td rowHead className="font-[560] break-all">
                {row.email}
              </Td>
              <Td label="Role">{capitalise(row.role)}</Td>
              <Td label="For">{describePlace(row)}</Td>
              <Td label="Invited by">{row.invitedBy}</Td>
              <Td label="Open">
                {row.expired ? (
                  <StatusTag tone="care">Too old since {row.until}</StatusTag>
                ) : (
                  <StatusTag tone="wait">Until {row.until}</StatusTag>
                )}
              </Td>
              <Td className="text-right">
                <span className="inline-flex flex-wrap gap-2 max-sm:mt-2 max-sm:w-full max-sm:*:grow sm:justify-end">
                  <Button
                    size="sm"
                    pending={busy === row.id}
                    aria-label={`Send the invitation to ${row.email} again`}
                    onClick={() => void sendAgain(row.id)}
                  >
                    Send again
                  </Button>
                  <ConfirmDialog
                    title="Withdraw this invitation?"
                    confirm="Withdraw it"
                    onConfirm={() => withdraw(row)}
                    trigger={
                      <Button size="sm" look="danger" aria-label={`Withdraw the invitation to ${row.email}`}>
                        Withdraw
                      </Button>
                    }
                  >
                    The link that was sent to {row.email} will open nothing any more. You can invite the
                    address again.
                  </ConfirmDialog>
                </span>
              </Td>
            </Tr>
          ))}
        </Tbody>
      </Table>
    </Card>
  );
}
