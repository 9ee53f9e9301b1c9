import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import { assertCan } from '@/lib/use-cases/context';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { StartRuleSetForm } from '../_components/start-rule-set-form';
import { startRuleSetAction } from '../actions';

export const metadata: Metadata = { title: 'Start a rule set' };

export default async function NewRuleSetPage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, `${paths.numberRules(league)}/new`);
  await showNotFound(Promise.resolve().then(() => assertCan(ctx.actor, 'rule-set.write')));
  const presets = listCataloguePresets().map(
    ({ id, sport, title, summary, citations, open, checkYourBook, ruleSet }) => ({
      id,
      sport,
      title,
      summary,
      citations: citations.map((citation) => ({ ...citation, settles: [...citation.settles] })),
      open: [...open],
      checkYourBook,
      sentences: describeRuleSet(ruleSet),
    }),
  );
  return (
    <>
      <PageHeader
        title="Start a rule set"
        subtitle="From a published code, with its citations, or from nothing. It begins as a draft; nothing is checked against it yet."
        back={<BackLink href={paths.numberRules(league)}>Number rules</BackLink>}
      />
      <StartRuleSetForm league={league} presets={presets} onStart={startRuleSetAction} />
    </>
  );
}
