import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/page-header';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { paths } from '@/lib/web/paths';
import { RosterCheckForm } from './_components/roster-check-form';
import { readWorkbookAction } from './actions';

export const metadata: Metadata = {
  title: 'Check a roster',
  description:
    'Paste or drop a roster, choose a published numbering code, and see what an official would object to.',
};

export default function CheckPage() {
  const presets = listCataloguePresets().map(
    ({ id, sport, title, citations, open, checkYourBook, ruleSet }) => ({
      id,
      sport,
      title,
      citations: citations.map(({ body, document, edition, rule, known }) => ({
        body,
        document,
        edition,
        rule,
        known,
      })),
      open: [...open],
      checkYourBook,
      ruleSet,
    }),
  );
  return (
    <>
      <PageHeader
        title="Check a roster"
        subtitle="Paste or drop a list, choose a numbering code, and see what would be found at the press or on the field. Nothing is stored."
      />
      <RosterCheckForm
        presets={presets}
        checkUrl={paths.api.rosterChecks()}
        onReadWorkbook={readWorkbookAction}
      />
    </>
  );
}
