import { ChoosePasswordForm } from '@/app/_components/choose-password-form';
import { NarrowPage } from '@/app/_components/narrow-page';
import { SpentLink } from '@/app/_components/spent-link';
import { findReset } from '@/lib/use-cases/account/find-reset';
import { paths } from '@/lib/web/paths';
import { readRequestContext } from '@/lib/web/request';
import { setNewPasswordAction } from '../actions';

export const metadata = { title: 'Choose a new password', referrer: 'no-referrer' as const };

export default async function SetNewPasswordPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const reset = await findReset(await readRequestContext(), token);
  if (!reset) {
    return (
      <SpentLink
        says="A link works once, for an hour. Ask for a new one; it goes to the address of your account."
        href={paths.askReset()}
        button="Ask for a new link"
      />
    );
  }
  return (
    <NarrowPage
      title="Choose a new password"
      lead={`For ${reset.email}. You are signed out on every device and in again on this one.`}
    >
      <ChoosePasswordForm
        token={token}
        email={reset.email}
        choose={setNewPasswordAction}
        onward={paths.signIn()}
        button="Set the new password"
      />
    </NarrowPage>
  );
}
