import { StatusTag, StatusText } from '@/components/ui/tag';
import type { Tone } from '@/components/ui/status-mark';
import { countOf } from '@/lib/domain/text/count-of';
import type { CheckSummary, Severity } from '@/lib/domain/rules/finding';

/** The tone of each severity. */
export const severityTone: Record<Severity, Tone> = { blocker: 'stop', caution: 'care', note: 'note' };

/** For a table cell: the shape of a severity and how many. Props: `severity`, `count`. Nothing when there are none. */
export function FindingMark({ severity, count }: { severity: Severity; count: number }) {
  if (count === 0) return null;
  return (
    <StatusText tone={severityTone[severity]}>
      <span aria-hidden="true">{count}</span>
      <span className="sr-only">{countOf(count, severity)}</span>
    </StatusText>
  );
}

/** For the head of a card: "3 blockers" as a tag. Props: `severity`, `count`. Nothing when there are none. */
export function FindingTag({ severity, count }: { severity: Severity; count: number }) {
  if (count === 0) return null;
  return <StatusTag tone={severityTone[severity]}>{countOf(count, severity)}</StatusTag>;
}

/** All of a check in one line of tags, or "nothing to fix". Props: `summary`. */
export function FindingSummary({
  summary,
}: {
  summary: Pick<CheckSummary, 'blockers' | 'cautions' | 'notes'>;
}) {
  const clear = summary.blockers + summary.cautions + summary.notes === 0;
  return (
    <span className="inline-flex flex-wrap gap-2">
      {clear && <StatusTag tone="set">nothing to fix</StatusTag>}
      <FindingTag severity="blocker" count={summary.blockers} />
      <FindingTag severity="caution" count={summary.cautions} />
      <FindingTag severity="note" count={summary.notes} />
    </span>
  );
}
