import { NarrowPage } from '@/app/_components/narrow-page';
import { TextLink } from '@/components/ui/text-link';
import { joinWords } from '@/lib/domain/text/sentence';
import { findInvitation, type OpenInvitation } from '@/lib/use-cases/people/find-invitation';
import { paths } from '@/lib/web/paths';
import { readRequestContext } from '@/lib/web/request';
import { findPersonOfRequest } from '@/lib/web/session';
import { AcceptWhenSignedIn } from './_components/accept-when-signed-in';
import { JoinAsNewcomer } from './_components/join-as-newcomer';
import { SignInToJoin } from './_components/sign-in-to-join';
import { acceptInvitationAction, joinAsNewcomerAction } from './actions';

export const metadata = { title: 'Invitation', referrer: 'no-referrer' as const };

export default async function JoinPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const invitation = await findInvitation(await readRequestContext(), token);
  if (invitation.state !== 'open') {
    return (
      <NarrowPage
        title="This invitation is not open"
        lead={says(invitation)}
        after={
          <p>
            <TextLink href={paths.signIn()}>Sign in</TextLink>
          </p>
        }
      />
    );
  }
  const person = await findPersonOfRequest();
  const onward = paths.signIn(paths.league(invitation.slug));
  const { email } = invitation;
  return (
    <NarrowPage title={`Join ${invitation.league}`} lead={describe(invitation)}>
      {person ? (
        <AcceptWhenSignedIn
          token={token}
          invited={email}
          signedInAs={person.email}
          accept={acceptInvitationAction}
          onward={onward}
          here={paths.join(token)}
        />
      ) : invitation.hasAccount ? (
        <SignInToJoin
          token={token}
          email={email}
          accept={acceptInvitationAction}
          onward={onward}
          resetPath={paths.askReset()}
        />
      ) : (
        <JoinAsNewcomer token={token} email={email} join={joinAsNewcomerAction} onward={onward} />
      )}
    </NarrowPage>
  );
}

function describe({ invitedBy, role, teams, shop, expires }: OpenInvitation): string {
  const as =
    role === 'team manager'
      ? `team manager of ${joinWords(teams)}`
      : role === 'decorator'
        ? `decorator for ${shop ?? 'the shop'}`
        : role;
  return `${invitedBy} invites you as ${as}. The invitation is open until ${expires}.`;
}

function says(
  invitation: { state: 'accepted' | 'withdrawn' | 'expired'; league: string } | { state: 'unknown' },
): string {
  switch (invitation.state) {
    case 'accepted':
      return `This invitation to ${invitation.league} was accepted already. Sign in to go on.`;
    case 'withdrawn':
      return `${invitation.league} has withdrawn this invitation. If you think that is a mistake, ask its league admin.`;
    case 'expired':
      return `This invitation to ${invitation.league} was open for 14 days and is too old now. Ask the league admin to send it again.`;
    case 'unknown':
      return 'This link belongs to no invitation. If you were sent a newer letter, use the link in that one.';
  }
}
