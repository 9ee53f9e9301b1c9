import type { Metadata } from 'next';
import { Card } from '@/components/ui/card';
import { PageHeader } from '@/components/ui/page-header';
import { TextLink } from '@/components/ui/text-link';
import { describeRoles } from '@/lib/domain/access/describe-roles';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';
import { changeNameAction, changePasswordAction, signOutEverywhereAction } from './actions';
import { NameForm } from './_components/name-form';
import { PasswordForm } from './_components/password-form';
import { SignOutEverywhere } from './_components/sign-out-everywhere';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const { person } = await requirePerson(paths.account());
  return (
    <>
      <PageHeader title="Your account" subtitle={person.email} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <div className="grid gap-5">
          <Card title="Name">
            <NameForm name={person.name} change={changeNameAction} />
          </Card>
          <Card title="Your roles">
            {person.leagues.length === 0 ? (
              <p className="text-dusk">
                You belong to no league yet. <TextLink href={paths.newLeague()}>Create one</TextLink>, or ask
                a league admin to invite {person.email}.
              </p>
            ) : (
              <ul className="divide-hem grid divide-y">
                {person.leagues.map(({ league, actor }) => (
                  <li
                    key={league.id}
                    className="flex flex-wrap justify-between gap-x-4 py-2 first:pt-0 last:pb-0"
                  >
                    <TextLink href={paths.league(league.slug)}>{league.name}</TextLink>
                    <span className="text-dusk">{describeRoles(actor.roles)}</span>
                  </li>
                ))}
              </ul>
            )}
          </Card>
        </div>
        <div className="grid gap-5">
          <Card title="Password">
            <PasswordForm email={person.email} change={changePasswordAction} />
          </Card>
          <Card title="Devices">
            <SignOutEverywhere end={signOutEverywhereAction} onward={paths.signIn()} />
          </Card>
        </div>
      </div>
    </>
  );
}
