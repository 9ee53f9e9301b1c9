import { describe, expect, it } from 'vitest';
import { judgeReadiness, type ReadinessFacts } from '@/lib/domain/readiness/judge-readiness';
import { makeBlankRuleSet } from '@/lib/domain/rules/blank-rule-set';
import { checkRoster } from '@/lib/domain/rules/check-roster';

const rules = makeBlankRuleSet('Ours', 'basketball');
const judge = (numbers: string[], over: Partial<ReadinessFacts> = {}) => {
  const lines = numbers.map((number, index) => ({
    name: `Player ${index}`,
    nameOnBack: '',
    number,
    role: '',
    sizes: {},
  }));
  return judgeReadiness({
    state: 'open',
    players: lines.length,
    least: 2,
    managers: 1,
    returnReason: null,
    batch: null,
    signedOffOn: null,
    check: checkRoster(rules, lines, []),
    numbers,
    ...over,
  });
};

describe('readiness', () => {
  it('says how many players wear a shared number, and blocks the team', () => {
    expect(judge(['14', '14', '3'])).toMatchObject({
      group: 'blocked',
      holds: '2 players wear 14',
      areas: { numbers: { blockers: 2 } },
    });
  });

  it('counts a roster below the least number of players as collecting, whatever else is wrong', () => {
    expect(judge(['14'])).toMatchObject({ group: 'collecting', holds: '1 player of at least 2' });
  });

  it('tells a missing roster from a missing manager', () => {
    expect(judge([]).holds).toBe('No roster yet');
    expect(judge([], { managers: 0 }).holds).toBe('No roster yet, and no manager has joined');
  });

  it('counts a team as ready only when it is signed off and in no batch', () => {
    expect(judge(['1', '2']).group).toBe('collecting');
    expect(judge(['1', '2'], { state: 'submitted' }).group).toBe('submitted');
    expect(judge(['1', '2'], { state: 'signed off' }).group).toBe('ready');
    expect(judge(['1', '2'], { state: 'frozen', batch: { code: 'B-07', state: 'on press' } })).toMatchObject({
      group: 'in a batch',
      holds: 'In batch B-07, on press',
    });
  });

  it('never calls a team ready to submit while its division has no rules in force', () => {
    expect(judge(['1', '2'], { check: null }).group).toBe('blocked');
  });

  it('repeats the reason a roster was returned for', () => {
    expect(judge(['1', '2'], { state: 'returned', returnReason: 'Check the spelling.' }).holds).toBe(
      'Returned: Check the spelling.',
    );
  });
});
