import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { suggestSeasonDays } from '@/lib/domain/dates/list-season-faults';
import { starterKits } from '@/lib/domain/kit/starter-kits';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { listCurrencies, listTimeZones } from '@/lib/web/league-choices';
import { paths } from '@/lib/web/paths';
import { requirePerson } from '@/lib/web/session';
import { createLeagueAction } from './actions';
import { CreateLeagueForm } from './_components/create-league-form';

export const metadata: Metadata = { title: 'Create a league' };

export default async function NewLeaguePage() {
  const { ctx } = await requirePerson(paths.newLeague());
  return (
    <>
      <PageHeader
        title="Create a league"
        subtitle="Four short steps. All of it can be changed later."
        back={<BackLink href={paths.leagues()}>Your leagues</BackLink>}
      />
      <CreateLeagueForm
        create={createLeagueAction}
        choices={{ timeZones: listTimeZones(), currencies: listCurrencies() }}
        days={suggestSeasonDays(ctx.now.toISOString().slice(0, 10))}
        presets={listCataloguePresets().map(({ id, sport, title, summary, ruleSet }) => ({
          id,
          sport,
          title,
          summary,
          least: ruleSet.roster.least,
          most: ruleSet.roster.most,
        }))}
        kits={starterKits.map(({ id, name, says }) => ({ id, name, says }))}
      />
    </>
  );
}
