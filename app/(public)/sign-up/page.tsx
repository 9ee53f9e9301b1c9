import { TextLink } from '@/components/ui/text-link';
import { NarrowPage } from '@/app/_components/narrow-page';
import { paths } from '@/lib/web/paths';
import { AskForAccountForm } from './_components/ask-for-account-form';
import { askForAccountAction } from './actions';

export const metadata = { title: 'Open an account' };

export default function SignUpPage() {
  return (
    <NarrowPage
      title="Open an account"
      lead="For whoever starts a league here. Were you invited to one? Then follow the link in your invitation instead."
      after={
        <p>
          You have an account? <TextLink href={paths.signIn()}>Sign in</TextLink>
        </p>
      }
    >
      <AskForAccountForm ask={askForAccountAction} />
    </NarrowPage>
  );
}
