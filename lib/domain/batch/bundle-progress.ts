/** How far a bundle is: `done` of `total` steps, what is being made now, and its size in bytes once it is ready. */
export type BundleProgress = {
  state: 'queued' | 'building' | 'ready' | 'failed';
  done: number;
  total: number;
  doing: string;
  failure: string | null;
  bytes: number | null;
};
