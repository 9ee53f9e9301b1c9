import type { Metadata } from 'next';
import Link from 'next/link';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { joinClasses } from '@/components/ui/join-classes';
import { PageHeader } from '@/components/ui/page-header';
import { formatShortInstant } from '@/lib/domain/dates/format';
import { countOf } from '@/lib/domain/text/count-of';
import { getEnv } from '@/lib/platform/env';
import { listInbox } from '@/lib/use-cases/mail/list-inbox';
import { paths } from '@/lib/web/paths';
import { showNotFound } from '@/lib/web/show-not-found';
import { MessageText } from './_components/message-text';
import { RefreshButton } from './_components/refresh-button';

export const metadata: Metadata = { title: 'Demo inbox' };

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

export default async function InboxPage({ searchParams }: Props) {
  const messages = await showNotFound(listInbox());
  const asked = (await searchParams)['message'];
  const open = messages?.find((message) => message.id === asked) ?? messages?.[0];
  return (
    <>
      <PageHeader
        title="Demo inbox"
        subtitle={`Every letter the demonstration sends is caught here and delivered to nobody.${messages ? ` ${countOf(messages.length, 'letter')}, newest first.` : ''}`}
        actions={<RefreshButton />}
      />
      {messages === null ? (
        <Card>
          <ErrorState title="The demonstration's mail server does not answer">
            Letters wait until it does. It starts with the product: look at the terminal for what it said.
          </ErrorState>
        </Card>
      ) : open === undefined ? (
        <Card>
          <EmptyState title="No letter yet" action={<RefreshButton />}>
            Invite somebody, ask for a new password or release a batch, and the letter arrives here within a
            few seconds.
          </EmptyState>
        </Card>
      ) : (
        <div className="grid items-start gap-5 lg:grid-cols-[22rem_minmax(0,1fr)]">
          <Card flush>
            <nav aria-label="Letters" className="max-h-[70dvh] overflow-y-auto">
              <ul className="divide-hem grid divide-y">
                {messages.map((message) => (
                  <li key={message.id}>
                    <Link
                      href={`${paths.inbox()}?message=${message.id}`}
                      aria-current={message.id === open.id ? 'page' : undefined}
                      className={joinClasses(
                        'block px-4 py-2.5 no-underline focus-visible:-outline-offset-2',
                        message.id === open.id ? 'bg-linen' : 'hover:bg-linen',
                      )}
                    >
                      <span className="block font-[560]">{message.subject}</span>
                      <span className="type-small text-dusk block break-all">{message.to.join(', ')}</span>
                      <span className="type-fine text-dusk block">
                        {formatShortInstant(new Date(message.at), 'UTC')} UTC
                      </span>
                    </Link>
                  </li>
                ))}
              </ul>
            </nav>
          </Card>
          <Card>
            <h2 className="type-section">{open.subject}</h2>
            <dl className="type-small text-dusk mt-1 mb-4 grid grid-cols-[auto_1fr] gap-x-3">
              <dt>From</dt>
              <dd className="break-all">{open.from}</dd>
              <dt>To</dt>
              <dd className="break-all">{open.to.join(', ')}</dd>
            </dl>
            <MessageText text={open.text} origin={new URL(getEnv().RAGLAN_BASE_URL).origin} />
          </Card>
        </div>
      )}
    </>
  );
}
