import {
  acknowledge,
  countUnsaved,
  dropMarks,
  editDocument,
  keepMine,
  openDocument,
  receiveNews,
  redoStep,
  startSending,
  takeBackSending,
  takeTheirs,
  undoStep,
  viewDocument,
  type OpenConflict,
  type RosterAnswer,
  type RosterDocument,
} from '@/lib/domain/roster/document';
import type { RosterEdit, RosterEntry } from '@/lib/domain/roster/edit';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import type { KeptWork, KeptWorkStore } from './kept-work';

/** How the saving stands. `refused` is the server's last word on the edits that still wait here. */
export type SaveState =
  | { is: 'saved'; at: number }
  | { is: 'saving' }
  | { is: 'offline' }
  | { is: 'signed out' }
  | { is: 'refused'; message: string };

export type SessionSnapshot = {
  document: RosterDocument;
  view: readonly RosterEntry[];
  save: SaveState;
  unsaved: number;
  /** Work of an earlier visit that was found and put back. */
  restored: { count: number; at: number } | null;
  /** Work of an earlier visit that can't be put back, because the roster is not open any more. */
  leftovers: { count: number; at: number } | null;
};

type Props = {
  url: string;
  roster: { revision: number; state: RosterState; players: RosterAnswer['players']; savedAt: number };
  editable: boolean;
  store: KeptWorkStore;
  /** The state of the roster has changed, so the page must be read again. */
  onStale: () => void;
  /** The name of the person at this screen. */
  me: string;
  fetch: typeof fetch;
  now: () => number;
};

/** Short enough that nobody waits for it, long enough that a row is sent as one. */
const restMs = 700;
const retryMs = [2_000, 4_000, 8_000, 15_000, 30_000];
const mostAtOnce = 500;

/**
 * One roster open in one tab: takes edits, sends them, retries, keeps what is not saved on the device, and takes in
 * what others change. React reads it through `subscribe` and `getSnapshot`.
 */
export class RosterSession {
  private readonly listeners = new Set<() => void>();
  private snapshot: SessionSnapshot;
  private state: RosterState;
  private editable: boolean;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private pumping: Promise<void> | undefined;
  private failures = 0;
  private running = false;
  /** What could not be saved before the roster was closed to edits; it stays on the device until it can, or is let go. */
  private aside: KeptWork | null = null;

  constructor(private readonly props: Props) {
    this.state = props.roster.state;
    this.editable = props.editable;
    const document = openDocument(props.roster);
    this.snapshot = {
      document,
      view: viewDocument(document),
      save: { is: 'saved', at: props.roster.savedAt },
      unsaved: 0,
      restored: null,
      leftovers: null,
    };
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
  readonly getSnapshot = (): SessionSnapshot => this.snapshot;

  /** Starts to save and puts back what an earlier visit left behind; ends with the answered function. */
  start(): () => void {
    this.running = true;
    const release = this.props.store.hold();
    void this.restore();
    return () => {
      this.running = false;
      clearTimeout(this.timer);
      release();
    };
  }

  edit(edits: readonly RosterEdit[]): void {
    this.change(editDocument(this.snapshot.document, edits));
  }

  /** Takes the latest step back; answers the edits that did it and how many cells others have changed since. */
  undo(): { edits: readonly RosterEdit[]; skipped: number } {
    const { document, ...turned } = undoStep(this.snapshot.document);
    this.change(document);
    return turned;
  }

  redo(): { edits: readonly RosterEdit[]; skipped: number } {
    const { document, ...turned } = redoStep(this.snapshot.document);
    this.change(document);
    return turned;
  }

  keepMine(conflict: OpenConflict): void {
    this.change(keepMine(this.snapshot.document, conflict));
  }

  takeTheirs(conflict: OpenConflict): void {
    this.change(takeTheirs(this.snapshot.document, conflict));
  }

  dropMarks(before: number): void {
    const document = dropMarks(this.snapshot.document, before);
    if (document !== this.snapshot.document) this.publish({ document });
  }

  dismissRestored(): void {
    this.publish({ restored: null });
  }

  /** Sends everything at once and answers whether the server has it all. */
  async flush(): Promise<boolean> {
    clearTimeout(this.timer);
    await this.pumping;
    await this.pump();
    return this.snapshot.unsaved === 0;
  }

  /** Tries again now, as after the connection or the session has come back. */
  retry(): void {
    if (this.snapshot.unsaved > 0) this.plan(0);
  }

  /** The page was read again, so its roster may be newer than what is known here. */
  receivePage(roster: Props['roster'], editable: boolean): void {
    this.state = roster.state;
    const wasEditable = this.editable;
    this.editable = editable;
    const document = receiveNews(this.snapshot.document, roster, this.readNow());
    if (wasEditable && !editable) this.putAside(document);
    else this.publish({ document });
    if (!wasEditable && editable) void this.restore();
  }

  /** Asks whether somebody else has changed the roster. Throws when the server can't be reached. */
  async poll(signal: AbortSignal): Promise<number> {
    if (this.pumping) return this.snapshot.document.revision;
    const since = this.snapshot.document.revision;
    const query = `?since=${since}&state=${encodeURIComponent(this.state)}`;
    const response = await this.props.fetch(this.props.url + query, { signal });
    if (!response.ok) throw new Error(String(response.status));
    const news = (await response.json()) as
      { changed: false } | ({ changed: true; state: RosterState } & RosterAnswer);
    if (news.changed) {
      if (news.state !== this.state) this.props.onStale();
      this.publish({ document: receiveNews(this.snapshot.document, news, this.readNow()) });
    }
    return this.snapshot.document.revision;
  }

  /** Forgets work of an earlier visit that has no roster to go into. */
  async discardLeftovers(): Promise<void> {
    const left = await this.props.store.listLeftBehind();
    this.props.store.forget(left.map(({ key }) => key));
    this.aside = null;
    this.publish({ document: this.snapshot.document, leftovers: null });
  }

  private readNow() {
    return { at: this.props.now(), me: this.props.me };
  }

  private change(document: RosterDocument): void {
    if (document === this.snapshot.document) return;
    // Somebody closed the roster while this was being typed.
    if (!this.editable) return this.putAside(document);
    this.publish({ document });
    if (this.snapshot.unsaved > 0) this.plan(restMs);
  }

  private plan(delay: number): void {
    if (!this.running || this.pumping) return;
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.pump(), delay);
  }

  private pump(): Promise<void> {
    if (!this.editable) return Promise.resolve();
    this.pumping ??= this.send().finally(() => {
      this.pumping = undefined;
    });
    return this.pumping;
  }

  private async send(): Promise<void> {
    for (;;) {
      const document = startSending(this.snapshot.document, mostAtOnce);
      if (document.sending.length === 0) return;
      this.publish({ document, save: { is: 'saving' } });
      if (!(await this.sendOnce(document))) return;
    }
  }

  /** One request; false when sending has to stop for now. */
  private async sendOnce({ revision, sending }: RosterDocument): Promise<boolean> {
    let response: Response;
    try {
      response = await this.props.fetch(this.props.url, {
        method: 'PATCH',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify({ baseRevision: revision, edits: sending }),
      });
      if (response.ok) {
        const answer = (await response.json()) as RosterAnswer;
        this.failures = 0;
        const document = acknowledge(this.snapshot.document, answer, this.readNow());
        this.publish({ document, save: { is: 'saved', at: this.props.now() } });
        return this.editable;
      }
    } catch {
      return this.wait();
    }
    // What the server may have begun is sent again as it is; only a clear refusal says that nothing was done.
    if (response.status >= 500 || response.status === 429 || response.status === 408) return this.wait();
    if (response.status === 401) {
      this.publish({ save: { is: 'signed out' } });
      return false;
    }
    const problem = (await response.json().catch(() => ({}))) as { detail?: string };
    const message = problem.detail ?? 'The server did not take it.';
    this.publish({ document: takeBackSending(this.snapshot.document), save: { is: 'refused', message } });
    if (response.status === 423 || response.status === 404) this.props.onStale();
    return false;
  }

  private wait(): false {
    const delay = retryMs[Math.min(this.failures, retryMs.length - 1)] ?? 30_000;
    this.failures += 1;
    this.publish({ save: { is: 'offline' } });
    clearTimeout(this.timer);
    if (this.running) this.timer = setTimeout(() => void this.pump(), delay);
    return false;
  }

  private async restore(): Promise<void> {
    const left = await this.props.store.listLeftBehind();
    const works = [...left.map(({ work }) => work), ...(this.aside ? [this.aside] : [])];
    // An answer on its way must be in before the edits it is about are put behind others.
    await this.pumping;
    const [first, ...others] = works;
    if (!this.running || first === undefined) return;
    const count = works.reduce((sum, { sending, waiting }) => sum + sending.length + waiting.length, 0);
    const found = { count, at: works.at(-1)?.at ?? 0 };
    if (!this.editable) {
      this.publish({ leftovers: found });
      return;
    }
    const { document } = this.snapshot;
    const opened = openDocument(
      { revision: document.revision, players: document.base },
      {
        sending: first.sending,
        waiting: [
          ...first.waiting,
          ...others.flatMap(({ sending, waiting }) => [...sending, ...waiting]),
          ...document.sending,
          ...document.waiting,
        ],
      },
    );
    this.aside = null;
    this.publish({
      document: { ...opened, done: document.done, undone: document.undone, marks: document.marks },
      restored: found,
      leftovers: null,
    });
    this.props.store.forget(left.map(({ key }) => key));
    this.plan(0);
  }

  /** The roster is no longer open: what waits here stays on the device, and the screen shows what is stored. */
  private putAside(document: RosterDocument): void {
    clearTimeout(this.timer);
    const work = toWork(document, this.props.now());
    const count = work.sending.length + work.waiting.length;
    if (count > 0) this.aside = joinWork(this.aside, work);
    const bare = { ...document, sending: [], waiting: [], conflicts: [], done: [], undone: [] };
    const { leftovers: before } = this.snapshot;
    const leftovers = count > 0 ? { count: count + (before?.count ?? 0), at: work.at } : before;
    this.publish({ document: bare, leftovers, save: { is: 'saved', at: work.at } });
  }

  private publish(
    change: Partial<Pick<SessionSnapshot, 'document' | 'save' | 'restored' | 'leftovers'>>,
  ): void {
    const next = { ...this.snapshot, ...change };
    if (change.document) {
      next.view = viewDocument(change.document);
      next.unsaved = countUnsaved(change.document);
      this.props.store.keep(joinWork(this.aside, toWork(change.document, this.props.now())));
    }
    this.snapshot = next;
    for (const listener of this.listeners) listener();
  }
}

const joinWork = (first: KeptWork | null, second: KeptWork): KeptWork =>
  first === null
    ? second
    : {
        ...second,
        sending: first.sending,
        waiting: [...first.waiting, ...second.sending, ...second.waiting],
      };

/** Conflicts are kept as the edits they came from: put back, they meet the same other value again. */
const toWork = ({ sending, waiting, conflicts }: RosterDocument, at: number): KeptWork => ({
  sending: [...sending],
  waiting: [...waiting, ...conflicts.map(({ edit }) => edit)],
  at,
});
