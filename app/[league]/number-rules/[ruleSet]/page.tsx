import type { Metadata } from 'next';
import { NumberRail } from '@/components/number-rail/number-rail';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Notice } from '@/components/ui/notice';
import { PageHeader } from '@/components/ui/page-header';
import { Tag } from '@/components/ui/tag';
import { BackLink } from '@/components/ui/text-link';
import { formatDay } from '@/lib/domain/dates/format';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import { sayHowKnown, writeCitation } from '@/lib/domain/rules/write-citation';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import { getRuleSet, type RuleSetDetail } from '@/lib/use-cases/rule-sets/get-rule-set';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { DraftButtons } from '../_components/draft-buttons';
import { discardDraftAction, putInForceAction } from '../actions';

export const metadata: Metadata = { title: 'Number rules' };

type Props = {
  params: Promise<{ league: string; ruleSet: string }>;
  searchParams: Promise<{ version?: string }>;
};

export default async function RuleSetPage({ params, searchParams }: Props) {
  const { league, ruleSet: id } = await params;
  const { ctx } = await requireLeague(league, paths.numberRuleSet(league, id));
  const detail = await showNotFound(getRuleSet(ctx, { ruleSetId: id }));
  const asked = Number((await searchParams).version);
  const inForce = detail.versions.find((version) => version.state === 'in force');
  const shown = detail.versions.find((version) => version.version === asked) ?? inForce ?? detail.versions[0];
  const draft = detail.versions.find((version) => version.state === 'draft');
  const here = paths.numberRuleSet(league, id);
  return (
    <>
      <PageHeader
        title={detail.name}
        subtitle={shown ? sayVersion(shown) : 'Nothing in force yet'}
        back={<BackLink href={paths.numberRules(league)}>Number rules</BackLink>}
        actions={
          detail.mayChange && (
            <>
              <ButtonLink href={`${here}/edit`}>
                {draft ? `Go on with draft ${draft.version}` : 'Draft a new version'}
              </ButtonLink>
              {draft && (
                <DraftButtons
                  league={league}
                  ruleSetId={detail.id}
                  draft={{ version: draft.version, rowVersion: draft.rowVersion }}
                  inForce={inForce?.version ?? null}
                  onDiscard={detail.versions.length > 1 ? discardDraftAction : null}
                  onPutInForce={putInForceAction}
                />
              )}
            </>
          )
        }
      />
      {draft && shown?.state === 'draft' && (
        <div className="mb-5">
          <Notice tone="note" title="This is a draft">
            Rosters are{' '}
            {inForce ? `still checked against version ${inForce.version}` : 'not checked against it'} until
            you put it in force.
          </Notice>
        </div>
      )}
      {shown && (
        <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_24rem]">
          <div className="grid gap-5">
            <Card title="What it says">
              <ul className="list-disc pl-5">
                {describeRuleSet(shown.ruleSet).map((sentence) => (
                  <li key={sentence}>{sentence}</li>
                ))}
              </ul>
            </Card>
            <Citations ruleSet={shown.ruleSet} />
          </div>
          <div className="grid gap-5">
            <Card title="Number rail">
              <NumberRail labels={buildNumberRail(shown.ruleSet, [])} />
            </Card>
            <Versions detail={detail} shown={shown.version} here={here} />
          </div>
        </div>
      )}
    </>
  );
}

type Version = RuleSetDetail['versions'][number];

const sayVersion = (version: Version): string => {
  if (version.state === 'draft') return `Version ${version.version}, a draft`;
  const since = version.inForceFrom === null ? '' : ` since ${formatDay(version.inForceFrom)}`;
  return version.state === 'in force'
    ? `Version ${version.version}, in force${since}`
    : `Version ${version.version}, superseded`;
};

function Citations({ ruleSet }: { ruleSet: Version['ruleSet'] }) {
  return (
    <Card title="Where it comes from">
      {ruleSet.citations.length === 0 ? (
        <p className="text-dusk">Rules of the league’s own; no published code is cited.</p>
      ) : (
        <>
          <ul className="grid gap-2">
            {ruleSet.citations.map((citation) => (
              <li key={`${citation.document} ${citation.edition} ${citation.rule}`}>
                {writeCitation(citation)} <Tag>{sayHowKnown(citation.known)}</Tag>
              </li>
            ))}
          </ul>
          <p className="text-dusk mt-3">Books change. Check the current one before you rely on this.</p>
        </>
      )}
    </Card>
  );
}

function Versions({ detail, shown, here }: { detail: RuleSetDetail; shown: number; here: string }) {
  return (
    <Card flush title="Versions">
      <ul>
        {detail.versions.map((version) => (
          <li key={version.id} className="border-hem border-t">
            <a
              href={`${here}?version=${version.version}`}
              aria-current={version.version === shown ? 'page' : undefined}
              className="aria-[current=page]:bg-damson-wash hover:bg-linen block px-4 py-2.5 no-underline focus-visible:-outline-offset-2"
            >
              {sayVersion(version)}
            </a>
          </li>
        ))}
      </ul>
      <p className="border-hem text-dusk border-t px-4 py-3">
        {detail.divisions.length === 0
          ? 'No division plays by it yet. Give it to one on the Divisions page.'
          : `Played by ${detail.divisions.map((division) => `${division.name} (${division.season})`).join(', ')}.`}
      </p>
    </Card>
  );
}
