import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { BackLink } from '@/components/ui/text-link';
import { notFound } from '@/lib/platform/errors';
import { getRuleSet } from '@/lib/use-cases/rule-sets/get-rule-set';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { RuleSetForm } from '../../_components/rule-set-form';
import { saveDraftAction } from '../../actions';

export const metadata: Metadata = { title: 'Draft number rules' };

export default async function EditRuleSetPage({
  params,
}: {
  params: Promise<{ league: string; ruleSet: string }>;
}) {
  const { league, ruleSet: id } = await params;
  const here = paths.numberRuleSet(league, id);
  const { ctx } = await requireLeague(league, `${here}/edit`);
  const detail = await showNotFound(getRuleSet(ctx, { ruleSetId: id }));
  const draft = detail.versions.find((version) => version.state === 'draft');
  const start =
    draft ?? detail.versions.find((version) => version.state === 'in force') ?? detail.versions[0];
  if (!detail.mayChange || !start) return showNotFound(Promise.reject(notFound('rule set')));
  return (
    <>
      <PageHeader
        title={`Draft of ${detail.name}`}
        subtitle={
          draft
            ? `Version ${draft.version}, not in force`
            : `Starts from version ${start.version}; nothing changes for rosters until you put it in force`
        }
        back={<BackLink href={here}>{detail.name}</BackLink>}
      />
      <RuleSetForm
        league={league}
        ruleSetId={detail.id}
        start={start.ruleSet}
        rowVersion={draft?.rowVersion ?? null}
        path={here}
        onSave={saveDraftAction}
      />
    </>
  );
}
