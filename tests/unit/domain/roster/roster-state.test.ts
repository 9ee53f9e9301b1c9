import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  isRosterEditable,
  judgeRosterStep,
  rosterStates,
  type RosterFacts,
  type RosterStep,
} from '@/lib/domain/roster/roster-state';

const steps: RosterStep[] = ['submit', 'withdraw', 'return', 'sign off', 'reopen', 'freeze'];
const facts = (over: Partial<RosterFacts>): RosterFacts => ({
  state: 'open',
  blockers: 0,
  players: 12,
  heldByBatch: null,
  ...over,
});

describe('the states of a roster', () => {
  it('lead from open through submitted and signed off to frozen', () => {
    expect(judgeRosterStep('submit', facts({}))).toEqual({ allowed: true, to: 'submitted' });
    expect(judgeRosterStep('sign off', facts({ state: 'submitted' }))).toEqual({
      allowed: true,
      to: 'signed off',
    });
    expect(judgeRosterStep('freeze', facts({ state: 'signed off' }))).toEqual({
      allowed: true,
      to: 'frozen',
    });
  });

  it('can never be submitted or signed off with a blocker or without players', () => {
    fc.assert(
      fc.property(fc.constantFrom(...rosterStates), fc.nat(5), fc.nat(3), (state, blockers, players) => {
        for (const step of ['submit', 'sign off'] as const) {
          if (judgeRosterStep(step, facts({ state, blockers, players })).allowed)
            expect([blockers, players > 0]).toEqual([0, true]);
        }
      }),
    );
  });

  it('cannot be taken back while a batch holds the roster', () => {
    for (const step of ['return', 'reopen'] as const) {
      expect(judgeRosterStep(step, facts({ state: 'signed off', heldByBatch: 'B-07' }))).toMatchObject({
        allowed: false,
        reason: expect.stringContaining('B-07') as string,
      });
    }
  });

  it('explain every refusal in a sentence', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...steps),
        fc.constantFrom(...rosterStates),
        fc.nat(2),
        (step, state, blockers) => {
          const verdict = judgeRosterStep(step, facts({ state, blockers }));
          if (!verdict.allowed) expect(verdict.reason).toMatch(/^[A-Z].+\.$/);
        },
      ),
    );
  });

  it('let players be edited only while the roster is open or returned', () => {
    expect(rosterStates.filter(isRosterEditable)).toEqual(['open', 'returned']);
  });
});
