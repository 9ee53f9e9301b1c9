import { NarrowPage } from '@/app/_components/narrow-page';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/lib/web/paths';
import { AskForResetForm } from './_components/ask-for-reset-form';
import { askForResetAction } from './actions';

export const metadata = { title: 'Set a new password' };

export default function AskForResetPage() {
  return (
    <NarrowPage
      title="Set a new password"
      lead="We send a link to the address of your account. It works once, for an hour."
      after={
        <p>
          It came back to you? <TextLink href={paths.signIn()}>Sign in</TextLink>
        </p>
      }
    >
      <AskForResetForm ask={askForResetAction} />
    </NarrowPage>
  );
}
