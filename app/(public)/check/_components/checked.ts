import type { RefusedRow } from '@/lib/domain/roster/import/read-roster';
import type { RosterLine } from '@/lib/domain/roster/player';
import type { CheckSummary, Finding } from '@/lib/domain/rules/finding';
import type { Citation, RuleSet } from '@/lib/domain/rules/rule-set';

export type CheckPreset = {
  id: string;
  sport: string;
  title: string;
  citations: Citation[];
  open: string[];
  checkYourBook: string;
  ruleSet: RuleSet;
};

/** What was checked, kept together so that the answer always stands beside the list it belongs to. */
export type Checked = {
  preset: CheckPreset;
  from: string;
  lines: RosterLine[];
  rowNumbers: number[];
  notes: string[];
  refused: RefusedRow[];
  findings: Finding[];
  summary: CheckSummary;
};
