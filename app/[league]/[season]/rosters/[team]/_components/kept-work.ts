import { z } from 'zod';
import { rosterEditSchema, type RosterEdit } from '@/lib/domain/roster/edit';

/** Edits of one screen that the server has not confirmed, kept on this device. */
export type KeptWork = { sending: RosterEdit[]; waiting: RosterEdit[]; at: number };

const keptSchema = z.object({
  sending: z.array(rosterEditSchema).max(5000),
  waiting: z.array(rosterEditSchema).max(5000),
  at: z.number(),
});

type Store = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>;
type Locks = Pick<LockManager, 'query' | 'request'>;

/**
 * Where the unsaved work of one person on one roster is kept. Each open tab has an entry of its own and holds a lock of
 * the same name; an entry without its lock was left behind by a tab that is gone, and is taken over by the next one.
 */
export class KeptWorkStore {
  private readonly prefix: string;
  private readonly own: string;

  constructor(
    private readonly store: Store | undefined,
    private readonly locks: Locks | undefined,
    names: { userId: string; rosterId: string; tabId: string },
  ) {
    this.prefix = `raglan.roster.${names.userId}.${names.rosterId}.`;
    this.own = this.prefix + names.tabId;
  }

  /** Holds the lock of this tab until the answered function is called. */
  hold(): () => void {
    let release = () => {};
    const until = new Promise<void>((resolve) => {
      release = resolve;
    });
    void this.locks?.request(this.own, () => until).catch(() => {});
    return release;
  }

  /** Keeps the work of this tab, or forgets it when there is none. Full or forbidden storage is no reason to stop. */
  keep(work: KeptWork): void {
    try {
      if (work.sending.length + work.waiting.length === 0) this.store?.removeItem(this.own);
      else this.store?.setItem(this.own, JSON.stringify(work));
    } catch {
      // The edits are still on the screen and on their way to the server.
    }
  }

  /** The work that tabs now gone left behind, oldest first; their entries stay until `forget`. */
  async listLeftBehind(): Promise<{ key: string; work: KeptWork }[]> {
    const keys: string[] = [];
    try {
      for (let at = 0; at < (this.store?.length ?? 0); at += 1) {
        const key = this.store?.key(at);
        if (key?.startsWith(this.prefix) && key !== this.own) keys.push(key);
      }
    } catch {
      return [];
    }
    if (keys.length === 0) return [];
    const held = new Set((await this.locks?.query())?.held?.map(({ name }) => name));
    return keys
      .filter((key) => !held.has(key))
      .flatMap((key) => {
        const work = this.read(key);
        return work ? [{ key, work }] : [];
      })
      .sort((a, b) => a.work.at - b.work.at);
  }

  forget(keys: readonly string[]): void {
    for (const key of keys) {
      try {
        this.store?.removeItem(key);
      } catch {
        // Nothing can be done about it, and edits sent twice are done once.
      }
    }
  }

  private read(key: string): KeptWork | undefined {
    try {
      const parsed = keptSchema.safeParse(JSON.parse(this.store?.getItem(key) ?? ''));
      return parsed.success ? parsed.data : undefined;
    } catch {
      return undefined;
    }
  }
}
