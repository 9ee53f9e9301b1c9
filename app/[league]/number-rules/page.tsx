import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { StatusTag } from '@/components/ui/tag';
import { TextLink } from '@/components/ui/text-link';
import { can } from '@/lib/domain/access/permissions';
import { formatDay } from '@/lib/domain/dates/format';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import { countOf } from '@/lib/domain/text/count-of';
import { joinWords } from '@/lib/domain/text/sentence';
import { listRuleSets } from '@/lib/use-cases/rule-sets/list-rule-sets';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';

export const metadata: Metadata = { title: 'Number rules' };

export default async function NumberRulesPage({ params }: { params: Promise<{ league: string }> }) {
  const { league } = await params;
  const { ctx } = await requireLeague(league, paths.numberRules(league));
  const ruleSets = await showNotFound(listRuleSets(ctx));
  const start = can(ctx.actor, 'rule-set.write') && (
    <ButtonLink look="primary" href={`${paths.numberRules(league)}/new`}>
      Start a rule set
    </ButtonLink>
  );
  return (
    <>
      <PageHeader
        title="Number rules"
        subtitle={`${countOf(ruleSets.length, 'rule set')}. Each division plays by one of them; a version in force never changes.`}
        actions={ruleSets.length > 0 && start}
      />
      {ruleSets.length === 0 ? (
        <Card>
          <EmptyState title="No rules yet" action={start}>
            Start from a published code and adapt it, or write your own. Every roster is then checked against
            it.
          </EmptyState>
        </Card>
      ) : (
        <div className="grid gap-5 xl:grid-cols-2">
          {ruleSets.map((ruleSet) => (
            <Card
              key={ruleSet.id}
              title={<TextLink href={paths.numberRuleSet(league, ruleSet.id)}>{ruleSet.name}</TextLink>}
              aside={
                ruleSet.inForce
                  ? `version ${ruleSet.inForce.version}, in force since ${formatDay(ruleSet.inForce.inForceFrom ?? '')}`
                  : undefined
              }
            >
              <div className="flex flex-wrap gap-2">
                {!ruleSet.inForce && <StatusTag tone="wait">not in force yet</StatusTag>}
                {ruleSet.draft && ruleSet.inForce && (
                  <StatusTag tone="note">version {ruleSet.draft.version} is being drafted</StatusTag>
                )}
              </div>
              <ul className="mt-2 list-disc pl-5">
                {describeRuleSet((ruleSet.inForce ?? ruleSet.draft)?.ruleSet ?? neverEmpty())
                  .slice(0, 4)
                  .map((sentence) => (
                    <li key={sentence}>{sentence}</li>
                  ))}
              </ul>
              <p className="text-dusk mt-3">
                {ruleSet.divisions.length === 0
                  ? 'No division of this season plays by it.'
                  : `Played by ${joinWords(ruleSet.divisions)}.`}
              </p>
            </Card>
          ))}
        </div>
      )}
    </>
  );
}

/** A rule set has a draft or a version in force from its first moment on; the database keeps it so. */
function neverEmpty(): never {
  throw new Error('a rule set without any version');
}
