import type { CellField } from '@/lib/domain/roster/edit';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';
import type { Finding, Severity } from '@/lib/domain/rules/finding';

/** The cell a finding is about, or null for the whole roster. */
export function fieldOfFinding(finding: Finding): CellField | null {
  if (finding.field === 'roster') return null;
  if (finding.field !== 'sizes') return finding.field;
  return finding.garment === undefined ? null : `size:${finding.garment}`;
}

/** Findings by the row they are about, counted from 0, and those about the whole roster. */
export function groupFindings(findings: readonly Finding[]): {
  whole: Finding[];
  byRow: ReadonlyMap<number, readonly Finding[]>;
} {
  const whole: Finding[] = [];
  const byRow = new Map<number, Finding[]>();
  for (const finding of findings) {
    if (finding.row === null) whole.push(finding);
    else byRow.set(finding.row, [...(byRow.get(finding.row) ?? []), finding]);
  }
  return { whole, byRow };
}

const weight: Record<Severity, number> = { blocker: 2, caution: 1, note: 0 };

/** The gravest finding about one cell of a row, if there is any. */
export function gravestOf(findings: readonly Finding[], field: CellField): Severity | null {
  const [first] = findings
    .filter((finding) => fieldOfFinding(finding) === field)
    .sort((a, b) => weight[b.severity] - weight[a.severity]);
  return first?.severity ?? null;
}

/** What stands before the suggestions of a finding. */
export function leadOfSuggestions(finding: Finding): string {
  switch (finding.field) {
    case 'number':
      return finding.code === 'number-unreadable' ? 'Use' : 'Free:';
    case 'sizes':
      return 'Nearest:';
    case 'role':
      return 'Give:';
    default:
      return 'Use';
  }
}

/** Whether a column can take the suggestions of a finding. */
export const findColumn = (columns: readonly RosterColumn[], finding: Finding): number =>
  columns.findIndex(({ field }) => field === fieldOfFinding(finding));
