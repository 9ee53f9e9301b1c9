import type { RosterState } from '../roster/roster-state';
import type { RosterCheck } from '../rules/check-roster';
import type { Finding, FindingCode } from '../rules/finding';
import { countOf } from '../text/count-of';

/** The columns of the readiness table that findings are counted in. */
export const readinessAreas = ['roster', 'numbers', 'sizes', 'names'] as const;
export type ReadinessArea = (typeof readinessAreas)[number];

const areaOf: Record<FindingCode, ReadinessArea> = {
  'number-missing': 'numbers',
  'number-unreadable': 'numbers',
  'number-not-allowed': 'numbers',
  'digit-not-allowed': 'numbers',
  'too-many-digits': 'numbers',
  'leading-zero': 'numbers',
  'zero-and-double-zero': 'numbers',
  'number-repeated': 'numbers',
  'number-reserved': 'numbers',
  'number-needs-role': 'numbers',
  'roster-too-small': 'roster',
  'roster-too-large': 'roster',
  'role-missing': 'roster',
  'player-name-missing': 'names',
  'player-repeated': 'names',
  'name-on-back-missing': 'names',
  'name-on-back-not-wanted': 'names',
  'name-too-long': 'names',
  'name-letters': 'names',
  'surname-needs-initial': 'names',
  'size-missing': 'sizes',
  'size-not-offered': 'sizes',
};

/** The column a kind of finding is counted in. */
export const findAreaOf = (code: FindingCode): ReadinessArea => areaOf[code];

/** Where a team stands: no list yet or a short one, something to fix, handed in, ready for a batch, or in one. */
export type ReadinessGroup = 'collecting' | 'blocked' | 'submitted' | 'ready' | 'in a batch';
export type AreaCounts = { blockers: number; cautions: number };

export type Readiness = {
  group: ReadinessGroup;
  areas: Record<ReadinessArea, AreaCounts>;
  /** One sentence: what holds the team, or how far it is. */
  holds: string;
};

/** What is known of a team's roster; dates are given as people read them. */
export type ReadinessFacts = {
  state: RosterState;
  players: number;
  least: number;
  managers: number;
  returnReason: string | null;
  batch: { code: string; state: string } | null;
  signedOffOn: string | null;
  check: RosterCheck | null;
  numbers: readonly string[];
};

/**
 * Says where a team stands and what holds it. A roster below the least number of players is still collecting, whatever
 * else is wrong with it; `check` is null while the division has no rules in force, and then nothing can be ready.
 */
export function judgeReadiness(facts: ReadinessFacts): Readiness {
  const findings = facts.check?.findings ?? [];
  const areas = countByArea(findings);
  return { areas, ...place(facts, findings) };
}

function countByArea(findings: readonly Finding[]): Record<ReadinessArea, AreaCounts> {
  const areas = {
    roster: { blockers: 0, cautions: 0 },
    numbers: { blockers: 0, cautions: 0 },
    sizes: { blockers: 0, cautions: 0 },
    names: { blockers: 0, cautions: 0 },
  };
  for (const { code, severity } of findings) {
    if (severity === 'blocker') areas[areaOf[code]].blockers += 1;
    if (severity === 'caution') areas[areaOf[code]].cautions += 1;
  }
  return areas;
}

function place(facts: ReadinessFacts, findings: readonly Finding[]): Pick<Readiness, 'group' | 'holds'> {
  if (facts.batch)
    return { group: 'in a batch', holds: `In batch ${facts.batch.code}, ${facts.batch.state}` };
  if (facts.state === 'signed off' || facts.state === 'frozen') {
    return {
      group: 'ready',
      holds: facts.signedOffOn === null ? `Roster ${facts.state}` : `Signed off ${facts.signedOffOn}`,
    };
  }
  if (facts.state === 'submitted') return { group: 'submitted', holds: 'Submitted, waits for sign-off' };
  if (facts.players === 0) {
    return {
      group: 'collecting',
      holds: facts.managers === 0 ? 'No roster yet, and no manager has joined' : 'No roster yet',
    };
  }
  if (facts.check === null) return { group: 'blocked', holds: 'Its division has no number rules in force' };
  if (facts.players < facts.least) {
    return { group: 'collecting', holds: `${countOf(facts.players, 'player')} of at least ${facts.least}` };
  }
  const blockers = findings.filter((finding) => finding.severity === 'blocker');
  if (blockers.length > 0) return { group: 'blocked', holds: sayFindings(blockers, facts.numbers) };
  if (facts.state === 'returned')
    return { group: 'collecting', holds: `Returned: ${facts.returnReason ?? 'look at it again'}` };
  const cautions = findings.filter((finding) => finding.severity === 'caution');
  return {
    group: 'collecting',
    holds:
      cautions.length > 0
        ? `Not submitted yet; ${sayFindings(cautions, facts.numbers)}`
        : 'Nothing to fix; not submitted yet',
  };
}

/** The first finding in few words, and how many more there are. */
function sayFindings(findings: readonly Finding[], numbers: readonly string[]): string {
  const [first] = findings;
  if (!first) return '';
  const alike = findings.filter((finding) => finding.code === first.code);
  const label = first.row === null ? '' : (numbers[first.row] ?? '');
  const shared = first.code === 'number-repeated' ? numbers.filter((number) => number === label).length : 0;
  const says =
    shared > 1
      ? `${shared} players wear ${label}`
      : first.code === 'size-missing'
        ? `${countOf(alike.length, 'size')} missing`
        : first.code === 'number-missing'
          ? `${countOf(alike.length, 'number')} missing`
          : // What stands behind a colon explains; here there is room for what is wrong.
            (first.message.split(': ')[0] ?? '').replace(/\.$/, '');
  const covered =
    shared > 1 ? shared : first.code === 'size-missing' || first.code === 'number-missing' ? alike.length : 1;
  const more = findings.length - covered;
  return more > 0 ? `${says}, and ${more} more` : says;
}
