/**
 * One order for the size codes of several runs, each smallest first: every run keeps its own order as long as the runs
 * agree with each other; where they contradict, the run named first wins. Each code comes once. Sizes have no order
 * of their own (is YL more than AS?), so it is taken from the runs and from nothing else.
 */
export function orderSizes(runs: readonly (readonly string[])[]): string[] {
  const codes = [...new Set(runs.flat())];
  const smallerThan = new Map(codes.map((code) => [code, new Set<string>()]));
  for (const run of runs) {
    run.forEach((code, at) => {
      const before = run[at - 1];
      if (before !== undefined && before !== code) smallerThan.get(code)?.add(before);
    });
  }
  const ordered: string[] = [];
  const waiting = new Set(codes);
  while (waiting.size > 0) {
    const free = [...waiting].find((code) => ![...(smallerThan.get(code) ?? [])].some((c) => waiting.has(c)));
    // Runs that contradict each other leave nothing free: take the first code that was named.
    const next = free ?? [...waiting][0];
    if (next === undefined) break;
    ordered.push(next);
    waiting.delete(next);
  }
  return ordered;
}
