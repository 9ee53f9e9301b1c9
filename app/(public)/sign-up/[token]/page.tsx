import { ChoosePasswordForm } from '@/app/_components/choose-password-form';
import { NarrowPage } from '@/app/_components/narrow-page';
import { SpentLink } from '@/app/_components/spent-link';
import { findPendingSignUp } from '@/lib/use-cases/account/find-sign-up';
import { paths } from '@/lib/web/paths';
import { readRequestContext } from '@/lib/web/request';
import { openAccountAction } from '../actions';

export const metadata = { title: 'Choose a password', referrer: 'no-referrer' as const };

export default async function OpenAccountPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const wish = await findPendingSignUp(await readRequestContext(), token);
  if (!wish) {
    return (
      <SpentLink
        says="If you have chosen a password already, sign in. Otherwise ask for a new link."
        href={paths.signUp()}
        button="Ask for a new link"
      />
    );
  }
  return (
    <NarrowPage title={`Welcome, ${wish.name}`} lead={`Choose a password for ${wish.email}.`}>
      <ChoosePasswordForm
        token={token}
        email={wish.email}
        choose={openAccountAction}
        onward={paths.signIn(paths.leagues())}
        button="Open the account"
      />
    </NarrowPage>
  );
}
