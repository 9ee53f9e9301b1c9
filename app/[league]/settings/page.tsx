import type { Metadata } from 'next';
import { Card } from '@/components/ui/card';
import { PageHeader } from '@/components/ui/page-header';
import { getLeagueSettings } from '@/lib/use-cases/leagues/get-league-settings';
import { listCurrencies, listTimeZones } from '@/lib/web/league-choices';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { SettingsForm } from './_components/settings-form';
import { changeLeagueAction } from './actions';

export const metadata: Metadata = { title: 'Settings' };

export default async function SettingsPage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.settings(league));
  const settings = await showNotFound(getLeagueSettings(ctx));
  return (
    <>
      <PageHeader title="Settings" subtitle={`Of ${settings.name}, for all its seasons.`} />
      <Card className="max-w-180">
        <SettingsForm
          league={league}
          settings={settings}
          choices={{ timeZones: listTimeZones(), currencies: listCurrencies() }}
          change={changeLeagueAction}
        />
      </Card>
    </>
  );
}
