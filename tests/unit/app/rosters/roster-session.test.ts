import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { KeptWorkStore } from '@/app/[league]/[season]/rosters/[team]/_components/kept-work';
import { RosterSession } from '@/app/[league]/[season]/rosters/[team]/_components/roster-session';
import { applyEdits } from '@/lib/domain/roster/apply-edits';
import { makeEmptyEntry } from '@/lib/domain/roster/cells';
import type { RosterEdit, RosterEntry } from '@/lib/domain/roster/edit';
import { foldEdits } from '@/lib/domain/roster/fold-edits';
import type { RosterState } from '@/lib/domain/roster/roster-state';

const idAt = (at: number): string => `00000000-0000-4000-8000-${String(at).padStart(12, '0')}`;
const player = (at: number, number: string): RosterEntry => ({
  ...makeEmptyEntry(idAt(at)),
  name: `Player ${at}`,
  number,
});
const set = (at: number, from: string, to: string): RosterEdit => ({
  kind: 'set',
  playerId: idAt(at),
  field: 'number',
  from,
  to,
});

type Weather = 'fine' | 'offline' | 'answer lost' | 'signed out' | 'locked' | 'refused' | 'broken';

/** A server as the session meets it, with the weather between them. */
class FakeServer {
  revision = 1;
  state: RosterState = 'open';
  players = [player(1, '4'), player(2, '14')];
  weather: Weather = 'fine';
  sent: RosterEdit[][] = [];

  page() {
    const players = this.players.map((entry) => ({ ...entry, changedBy: 'Ben' }));
    return { revision: this.revision, state: this.state, players, savedAt: 0 };
  }

  fetch: typeof fetch = async (_url, init) => {
    if (this.weather === 'offline') throw new TypeError('Failed to fetch');
    if (init?.method !== 'PATCH') return Response.json({ changed: true, ...this.page() });
    if (this.weather === 'signed out') return Response.json({ detail: 'Sign in again.' }, { status: 401 });
    if (this.weather === 'locked') return Response.json({ detail: 'It is submitted.' }, { status: 423 });
    if (this.weather === 'refused') return Response.json({ detail: 'At most 200.' }, { status: 422 });
    if (this.weather === 'broken') return new Response('', { status: 502 });
    const { edits } = JSON.parse(String(init.body)) as { edits: RosterEdit[] };
    this.sent.push(edits);
    const outcome = applyEdits(this.players, foldEdits(edits));
    this.players = outcome.players;
    if (outcome.applied.length > 0) this.revision += 1;
    if (this.weather === 'answer lost') throw new TypeError('Failed to fetch');
    return Response.json({ ...this.page(), conflicts: outcome.conflicts });
  };
}

class FakeStorage {
  private readonly entries = new Map<string, string>();
  get length() {
    return this.entries.size;
  }
  key = (at: number) => [...this.entries.keys()][at] ?? null;
  getItem = (key: string) => this.entries.get(key) ?? null;
  setItem = (key: string, value: string) => void this.entries.set(key, value);
  removeItem = (key: string) => void this.entries.delete(key);
}

let storage: FakeStorage;
let server: FakeServer;
let tabs = 0;
const stops: (() => void)[] = [];

function openTab(given: { userId?: string; editable?: boolean } = {}) {
  const onStale = vi.fn();
  const session = new RosterSession({
    url: '/roster',
    roster: server.page(),
    editable: given.editable ?? true,
    store: new KeptWorkStore(storage, undefined, {
      userId: given.userId ?? 'ana',
      rosterId: 'herons',
      tabId: String((tabs += 1)),
    }),
    me: 'Ana',
    onStale,
    fetch: server.fetch,
    now: () => Date.now(),
  });
  const stop = session.start();
  stops.push(stop);
  return { session, stop, onStale, read: () => session.getSnapshot() };
}
const numbers = (view: readonly RosterEntry[]) => view.map(({ number }) => number);

beforeEach(() => {
  vi.useFakeTimers();
  storage = new FakeStorage();
  server = new FakeServer();
});
afterEach(() => {
  for (const stop of stops.splice(0)) stop();
  vi.useRealTimers();
});

describe('a roster open in a tab', () => {
  it('saves a moment after the last change, several changes as one, and keeps nothing on the device then', async () => {
    const { session, read } = openTab();
    session.edit([set(1, '4', '5')]);
    session.edit([set(1, '5', '6'), set(2, '14', '15')]);
    expect(numbers(read().view)).toEqual(['6', '15']);
    expect(storage.length).toBe(1);
    await vi.runOnlyPendingTimersAsync();
    expect(server.sent).toEqual([[set(1, '4', '6'), set(2, '14', '15')]]);
    expect(read()).toMatchObject({ unsaved: 0, save: { is: 'saved' } });
    expect(storage.length).toBe(0);
  });

  it('keeps trying while the connection is gone, and loses nothing', async () => {
    const { session, read } = openTab();
    server.weather = 'offline';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(10_000);
    expect(read()).toMatchObject({ unsaved: 1, save: { is: 'offline' } });
    server.weather = 'fine';
    await vi.advanceTimersByTimeAsync(30_000);
    expect(read()).toMatchObject({ unsaved: 0, save: { is: 'saved' } });
    expect(numbers(server.players)).toEqual(['5', '14']);
  });

  it('does not fight with itself when the answer to a save was lost', async () => {
    const { session, read } = openTab();
    server.weather = 'answer lost';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(1_000);
    session.edit([set(1, '5', '7')]);
    server.weather = 'fine';
    await vi.advanceTimersByTimeAsync(60_000);
    expect(read().document.conflicts).toEqual([]);
    expect(numbers(server.players)).toEqual(['7', '14']);
  });

  it('waits when the session has ended, and goes on when the person is back', async () => {
    const { session, read } = openTab();
    server.weather = 'signed out';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(read()).toMatchObject({ unsaved: 1, save: { is: 'signed out' } });
    expect(storage.length).toBe(1);
    server.weather = 'fine';
    session.retry();
    await vi.advanceTimersByTimeAsync(10);
    expect(read()).toMatchObject({ unsaved: 0, save: { is: 'saved' } });
  });

  it('says why when the server refuses, keeps the edits, and can take them back', async () => {
    const { session, read } = openTab();
    server.weather = 'refused';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(5_000);
    expect(read()).toMatchObject({ unsaved: 1, save: { is: 'refused', message: 'At most 200.' } });
    session.undo();
    expect(read().unsaved).toBe(0);
  });

  it('asks for the page anew when the roster was closed, keeps what was typed, and puts it back when it is open', async () => {
    const { session, read, onStale } = openTab();
    server.weather = 'locked';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(1_000);
    expect(onStale).toHaveBeenCalled();
    server.state = 'submitted';
    session.receivePage(server.page(), false);
    expect(read()).toMatchObject({ unsaved: 0, leftovers: { count: 1 } });
    expect(numbers(read().view)).toEqual(['4', '14']);
    // News that come while it is closed do not wipe it out.
    server.revision += 1;
    session.receivePage(server.page(), false);
    expect(storage.length).toBe(1);
    server.weather = 'fine';
    server.state = 'open';
    session.receivePage(server.page(), true);
    await vi.advanceTimersByTimeAsync(1_000);
    expect(numbers(server.players)).toEqual(['5', '14']);
    expect(read()).toMatchObject({ unsaved: 0, leftovers: null });
    expect(storage.length).toBe(0);
  });

  it('puts aside what is still typed after the roster was closed, beside what was put aside before', async () => {
    const { session, read } = openTab();
    server.weather = 'locked';
    session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(1_000);
    server.state = 'submitted';
    session.receivePage(server.page(), false);
    session.edit([set(2, '14', '15')]);
    expect(read()).toMatchObject({ unsaved: 0, leftovers: { count: 2 } });
    expect(numbers(read().view)).toEqual(['4', '14']);
    server.weather = 'fine';
    server.state = 'open';
    session.receivePage(server.page(), true);
    await vi.advanceTimersByTimeAsync(1_000);
    expect(numbers(server.players)).toEqual(['5', '15']);
    expect(storage.length).toBe(0);
  });

  it('puts back what a closed tab left behind, and says so', async () => {
    const first = openTab();
    server.weather = 'offline';
    first.session.edit([set(1, '4', '5'), set(2, '14', '15')]);
    await vi.advanceTimersByTimeAsync(800);
    first.stop();
    server.weather = 'fine';
    const second = openTab();
    await vi.advanceTimersByTimeAsync(1_000);
    expect(second.read()).toMatchObject({ unsaved: 0, restored: { count: 2 } });
    expect(numbers(server.players)).toEqual(['5', '15']);
    expect(storage.length).toBe(0);
  });

  it('puts back nothing of another person at the same machine', async () => {
    const ana = openTab();
    server.weather = 'offline';
    ana.session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(800);
    ana.stop();
    server.weather = 'fine';
    const ben = openTab({ userId: 'ben' });
    await vi.advanceTimersByTimeAsync(5_000);
    expect(ben.read().restored).toBeNull();
    expect(numbers(server.players)).toEqual(['4', '14']);
  });

  it('keeps a conflict that nobody has settled over a reload', async () => {
    const first = openTab();
    server.players = [player(1, '9'), player(2, '14')];
    server.revision += 1;
    first.session.edit([set(1, '4', '5')]);
    await vi.advanceTimersByTimeAsync(1_000);
    expect(first.read().document.conflicts).toHaveLength(1);
    first.stop();
    const second = openTab();
    await vi.advanceTimersByTimeAsync(1_000);
    const [conflict] = second.read().document.conflicts;
    expect(conflict).toMatchObject({ edit: { to: '5' }, theirs: { is: 'cell', value: '9' } });
    if (conflict) second.session.keepMine(conflict);
    await vi.advanceTimersByTimeAsync(1_000);
    expect(numbers(server.players)).toEqual(['5', '14']);
  });

  it('is not disturbed by what lies broken in storage', async () => {
    storage.setItem('raglan.roster.ana.herons.1', '{"sending":[{"kind":"set"');
    storage.setItem('raglan.roster.ana.herons.2', '{"sending":[{"kind":"drop table"}],"waiting":[],"at":1}');
    const { read } = openTab();
    await vi.advanceTimersByTimeAsync(1_000);
    expect(read()).toMatchObject({ unsaved: 0, restored: null });
  });

  it('has everything saved when it says so before a step is taken', async () => {
    const { session } = openTab();
    session.edit([set(1, '4', '5')]);
    expect(await session.flush()).toBe(true);
    expect(numbers(server.players)).toEqual(['5', '14']);
    server.weather = 'offline';
    session.edit([set(1, '5', '6')]);
    expect(await session.flush()).toBe(false);
  });

  it('takes in what others changed, and reads the page anew when the state changed', async () => {
    const { session, read, onStale } = openTab();
    server.players = [player(1, '9'), player(2, '14')];
    server.revision += 1;
    await session.poll(new AbortController().signal);
    expect(numbers(read().view)).toEqual(['9', '14']);
    expect(read().document.marks).toMatchObject([{ field: 'number', by: 'Ben' }]);
    expect(onStale).not.toHaveBeenCalled();
    server.state = 'submitted';
    await session.poll(new AbortController().signal);
    expect(onStale).toHaveBeenCalledOnce();
  });
});
