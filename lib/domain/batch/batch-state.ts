/** The states of a batch, in order. Each can only be followed by the next. */
export const batchStates = ['held', 'released', 'on press', 'packed', 'shipped', 'received'] as const;
export type BatchState = (typeof batchStates)[number];

/** Who moves a batch into each state: the league holds, releases and receives; the shop does the rest. */
export const batchStateOwner: Record<BatchState, 'league' | 'shop'> = {
  held: 'league',
  released: 'league',
  'on press': 'shop',
  packed: 'shop',
  shipped: 'shop',
  received: 'league',
};

/** The state after this one, or null at the end. */
export function nextBatchState(state: BatchState): BatchState | null {
  return batchStates[batchStates.indexOf(state) + 1] ?? null;
}

/** The state before this one that a mistaken step may be taken back to, or null: a release is never taken back. */
export function previousBatchState(state: BatchState): BatchState | null {
  const at = batchStates.indexOf(state);
  return at >= 2 ? (batchStates[at - 1] ?? null) : null;
}
