/** The states of a roster, in the order they are usually passed. */
export const rosterStates = ['open', 'submitted', 'returned', 'signed off', 'frozen'] as const;
export type RosterState = (typeof rosterStates)[number];

/** What a person can do to a roster's state. `reopen` undoes a sign-off or a freeze that no batch holds yet. */
export type RosterStep = 'submit' | 'withdraw' | 'return' | 'sign off' | 'reopen' | 'freeze';

const transitions: Record<RosterStep, { from: readonly RosterState[]; to: RosterState }> = {
  submit: { from: ['open', 'returned'], to: 'submitted' },
  withdraw: { from: ['submitted'], to: 'open' },
  return: { from: ['submitted', 'signed off'], to: 'returned' },
  'sign off': { from: ['submitted'], to: 'signed off' },
  reopen: { from: ['signed off', 'frozen'], to: 'open' },
  freeze: { from: ['signed off'], to: 'frozen' },
};

/** What the guard must know besides the state itself. */
export type RosterFacts = {
  state: RosterState;
  blockers: number;
  players: number;
  heldByBatch: string | null;
};

/** Where a step leads, or the sentence that says why it may not be taken. */
export type StepVerdict = { allowed: true; to: RosterState } | { allowed: false; reason: string };

/**
 * Decides whether a step may be taken from the present facts: `submit` and `sign off` need at least one player and
 * no blockers, `return` and `reopen` need a roster that no batch holds (`heldByBatch` is that batch's code).
 */
export function judgeRosterStep(step: RosterStep, facts: RosterFacts): StepVerdict {
  const { from, to } = transitions[step];
  if (!from.includes(facts.state)) {
    return { allowed: false, reason: `This roster is ${facts.state}, so it can't be ${pastTense[step]}.` };
  }
  if ((step === 'submit' || step === 'sign off') && facts.players === 0) {
    return { allowed: false, reason: `This roster has no players yet, so it can't be ${pastTense[step]}.` };
  }
  if ((step === 'submit' || step === 'sign off') && facts.blockers > 0) {
    const count = facts.blockers === 1 ? '1 blocker' : `${facts.blockers} blockers`;
    return { allowed: false, reason: `Put ${count} right first; each is marked beside its cell.` };
  }
  if ((step === 'return' || step === 'reopen') && facts.heldByBatch !== null) {
    return {
      allowed: false,
      reason: `Batch ${facts.heldByBatch} holds this roster. Take the team out of the batch first.`,
    };
  }
  return { allowed: true, to };
}

const pastTense: Record<RosterStep, string> = {
  submit: 'submitted',
  withdraw: 'withdrawn',
  return: 'returned',
  'sign off': 'signed off',
  reopen: 'reopened',
  freeze: 'frozen',
};

/** Whether players of a roster in this state may still be edited. */
export const isRosterEditable = (state: RosterState): boolean => state === 'open' || state === 'returned';
