import { redirect } from 'next/navigation';
import { NarrowPage } from '@/app/_components/narrow-page';
import { TextLink } from '@/components/ui/text-link';
import { chooseHome, readNext } from '@/lib/domain/league/home';
import { getEnv } from '@/lib/platform/env';
import { pathOfHome } from '@/lib/web/home';
import { paths } from '@/lib/web/paths';
import { findPersonOfRequest } from '@/lib/web/session';
import { SignInForm } from './_components/sign-in-form';

export const metadata = { title: 'Sign in' };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const query = await searchParams;
  const next = readNext(query['next']);
  const person = await findPersonOfRequest();
  if (person) redirect(next ?? pathOfHome(chooseHome(person)));
  return (
    <NarrowPage
      title="Sign in"
      {...(next !== null && { lead: 'You go on to the page you asked for.' })}
      after={
        <p>
          New here? <TextLink href={paths.signUp()}>Open an account</TextLink>
        </p>
      }
    >
      <SignInForm
        onward={paths.signIn(next ?? undefined)}
        resetPath={paths.askReset()}
        failed={query['error'] !== undefined}
        demo={getEnv().RAGLAN_DEMO}
      />
    </NarrowPage>
  );
}
