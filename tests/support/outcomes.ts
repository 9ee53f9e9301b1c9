/** How one of several attempts ended: `done`, or the code it was refused with (a fault has none of ours). */
export const codeOf = (outcome: PromiseSettledResult<unknown>): string =>
  outcome.status === 'fulfilled'
    ? 'done'
    : String((outcome.reason as { code?: unknown }).code ?? outcome.reason);
