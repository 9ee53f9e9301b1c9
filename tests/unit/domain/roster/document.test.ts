import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { applyEdits, playerAbove, type EditConflict } from '@/lib/domain/roster/apply-edits';
import { isSameEntry, makeEmptyEntry, readCell } from '@/lib/domain/roster/cells';
import {
  acknowledge,
  countUnsaved,
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
  type RosterDocument,
} from '@/lib/domain/roster/document';
import type { CellField, RosterEdit, RosterEntry } from '@/lib/domain/roster/edit';
import { foldEdits } from '@/lib/domain/roster/fold-edits';

const idAt = (at: number): string => `00000000-0000-4000-8000-${String(at).padStart(12, '0')}`;
const player = (at: number, number: string): RosterEntry => ({
  ...makeEmptyEntry(idAt(at)),
  name: `Player ${at}`,
  number,
});
const start = [player(1, '4'), player(2, '14'), player(3, '21')];

/** What the server does with edits: the same fold and apply as the use case, and a revision. */
class Server {
  revision = 1;
  players: RosterEntry[] = start.map((entry) => ({ ...entry }));

  save(edits: readonly RosterEdit[]): { revision: number; conflicts: EditConflict[] } {
    const outcome = applyEdits(this.players, foldEdits(edits));
    if (outcome.applied.length > 0) this.revision += 1;
    this.players = outcome.players;
    return { revision: this.revision, conflicts: outcome.conflicts };
  }

  answer(conflicts: EditConflict[] = []) {
    const players = this.players.map((entry) => ({ ...entry, changedBy: 'Ben' }));
    return { revision: this.revision, players, conflicts };
  }
}

const set = (document: RosterDocument, at: number, field: CellField, to: string): RosterDocument => {
  const seen = viewDocument(document).find(({ id }) => id === idAt(at));
  if (!seen) return document;
  return editDocument(document, [{ kind: 'set', playerId: seen.id, field, from: readCell(seen, field), to }]);
};
const numbers = (document: RosterDocument) => viewDocument(document).map(({ number }) => number);
const now = { at: 0, me: 'Ana' };
const open = () => openDocument({ revision: 1, players: start });

describe('a roster open on a screen', () => {
  it('shows what was typed at once, before and while it is sent and after', () => {
    let document = set(open(), 1, 'number', '5');
    expect(numbers(document)).toEqual(['5', '14', '21']);
    document = startSending(document, 100);
    document = set(document, 1, 'number', '6');
    expect(numbers(document)).toEqual(['6', '14', '21']);
    const server = new Server();
    document = acknowledge(document, server.answer(server.save(document.sending).conflicts), now);
    expect(numbers(document)).toEqual(['6', '14', '21']);
    expect([document.sending, countUnsaved(document), document.conflicts, document.marks]).toEqual([
      [],
      1,
      [],
      [],
    ]);
  });

  it('takes steps back and does them again, also after they were saved', () => {
    const server = new Server();
    let document = set(set(open(), 1, 'number', '5'), 2, 'number', '15');
    document = startSending(document, 100);
    document = acknowledge(document, server.answer(server.save(document.sending).conflicts), now);
    document = undoStep(document).document;
    expect(numbers(document)).toEqual(['5', '14', '21']);
    document = undoStep(document).document;
    expect(numbers(document)).toEqual(['4', '14', '21']);
    document = redoStep(document).document;
    expect(numbers(document)).toEqual(['5', '14', '21']);
    document = startSending(document, 100);
    server.save(document.sending);
    expect(server.players.map(({ number }) => number)).toEqual(['5', '14', '21']);
  });

  it('does not take back what somebody else has changed since', () => {
    const server = new Server();
    let document = startSending(set(open(), 1, 'number', '5'), 100);
    document = acknowledge(document, server.answer(server.save(document.sending).conflicts), now);
    server.save([{ kind: 'set', playerId: idAt(1), field: 'number', from: '5', to: '9' }]);
    document = receiveNews(document, server.answer(), now);
    const turned = undoStep(document);
    expect(turned.skipped).toBe(1);
    expect(numbers(turned.document)).toEqual(['9', '14', '21']);
  });

  it('marks a cell that somebody else has changed, until it is typed into', () => {
    const server = new Server();
    server.save([{ kind: 'set', playerId: idAt(2), field: 'number', from: '14', to: '15' }]);
    let document = receiveNews(open(), server.answer(), { ...now, at: 77 });
    expect(document.marks).toEqual([{ playerId: idAt(2), field: 'number', by: 'Ben', at: 77 }]);
    document = set(document, 2, 'number', '16');
    expect(document.marks).toEqual([]);
  });

  it('does not mark what the same person changed in another tab', () => {
    const server = new Server();
    server.save([{ kind: 'set', playerId: idAt(2), field: 'number', from: '14', to: '15' }]);
    expect(receiveNews(open(), server.answer(), { at: 0, me: 'Ben' }).marks).toEqual([]);
  });

  it('ignores news older than what it knows', () => {
    const server = new Server();
    const old = server.answer();
    let document = startSending(set(open(), 1, 'number', '5'), 100);
    document = acknowledge(document, server.answer(server.save(document.sending).conflicts), now);
    expect(receiveNews(document, old, now)).toBe(document);
  });

  it('shows a conflict with both values and lets the person keep either', () => {
    const server = new Server();
    server.save([{ kind: 'set', playerId: idAt(1), field: 'number', from: '4', to: '9' }]);
    const document = receiveNews(set(open(), 1, 'number', '5'), server.answer(), now);
    const [conflict] = document.conflicts;
    expect(conflict).toMatchObject({ edit: { to: '5' }, theirs: { is: 'cell', value: '9' } });
    expect(numbers(document)[0]).toBe('9');
    if (!conflict) return;
    const mine = keepMine(document, conflict);
    expect([numbers(mine)[0], mine.conflicts]).toEqual(['5', []]);
    const theirs = takeTheirs(document, conflict);
    expect([numbers(theirs)[0], theirs.conflicts, countUnsaved(theirs)]).toEqual(['9', [], 0]);
  });

  it('brings a player back who was removed while somebody typed into them, when that is kept', () => {
    const server = new Server();
    server.save([{ kind: 'remove', was: player(2, '14'), after: idAt(1) }]);
    let document = receiveNews(
      set(set(open(), 2, 'number', '15'), 2, 'role', 'goalkeeper'),
      server.answer(),
      now,
    );
    expect(document.conflicts).toHaveLength(2);
    for (const conflict of document.conflicts) document = keepMine(document, conflict);
    expect(document.conflicts).toEqual([]);
    expect(viewDocument(document).at(-1)).toMatchObject({
      name: 'Player 2',
      number: '15',
      role: 'goalkeeper',
    });
  });

  it('keeps edits that the server refused, to be sent again', () => {
    const document = takeBackSending(set(startSending(set(open(), 1, 'number', '5'), 100), 1, 'number', '6'));
    expect(document.waiting).toEqual([
      { kind: 'set', playerId: idAt(1), field: 'number', from: '4', to: '6' },
    ]);
  });
});

const actionArb = fc.record({
  who: fc.integer({ min: 0, max: 1 }),
  what: fc.constantFrom('type', 'type', 'type', 'add', 'remove', 'undo', 'send', 'lose', 'answer', 'news'),
  row: fc.nat(5),
  field: fc.constantFrom<CellField>('name', 'number', 'size:jersey'),
  value: fc.constantFrom('', '4', '5', '6', 'YM'),
});

/** Two screens and a server; an answer may be lost after the server has done the work. */
function play(
  actions: readonly (typeof actionArb extends fc.Arbitrary<infer T> ? T : never)[],
  people: number,
) {
  const server = new Server();
  const screens = [open(), open()];
  let nextId = 100;
  const send = (document: RosterDocument, lost: boolean): RosterDocument => {
    const sent = startSending(document, 3);
    if (sent.sending.length === 0) return sent;
    const { conflicts } = server.save(sent.sending);
    return lost ? sent : acknowledge(sent, server.answer(conflicts), now);
  };
  for (const { who: asked, what, row, field, value } of actions) {
    const who = asked % people;
    const document = screens[who] ?? open();
    const view = viewDocument(document);
    const target = view[row % Math.max(1, view.length)];
    const step = (): RosterDocument => {
      if (what === 'type' && target) {
        const from = readCell(target, field);
        return editDocument(document, [{ kind: 'set', playerId: target.id, field, from, to: value }]);
      }
      if (what === 'remove' && target) {
        const after = playerAbove(view, row % view.length);
        return editDocument(document, [{ kind: 'remove', was: target, after }]);
      }
      if (what === 'add') {
        const added = { ...makeEmptyEntry(idAt((nextId += 1))), name: value };
        return editDocument(document, [{ kind: 'add', player: added, after: view.at(-1)?.id ?? null }]);
      }
      if (what === 'undo') return undoStep(document).document;
      if (what === 'lose') return send(document, true);
      if (what === 'news') return receiveNews(document, server.answer(), now);
      return what === 'send' || what === 'answer' ? send(document, false) : document;
    };
    screens[who] = step();
  }
  const drain = (document: RosterDocument): RosterDocument => {
    let rest = document;
    for (let round = 0; countUnsaved(rest) > 0; round += 1) {
      if (round > 500) throw new Error('edits are sent for ever');
      rest = send(rest, false);
    }
    return receiveNews(rest, server.answer(), now);
  };
  return { server, screens: screens.slice(0, people), drain };
}

const sameList = (one: readonly RosterEntry[], other: readonly RosterEntry[]) =>
  one.length === other.length &&
  one.every((entry, at) => isSameEntry(entry, other[at] ?? makeEmptyEntry('')));

describe('screens and a server', () => {
  it('end with the same roster once everything is sent, whatever was lost on the way', () => {
    fc.assert(
      fc.property(fc.array(actionArb, { maxLength: 40 }), (actions) => {
        const { server, screens, drain } = play(actions, 2);
        const ended = screens.map(drain).map(drain);
        for (const document of ended.map((one) => receiveNews(one, server.answer(), now))) {
          expect(sameList(viewDocument(document), server.players)).toBe(true);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('never make a person fight with themselves: one screen has no conflicts, and what it shows is what is saved', () => {
    fc.assert(
      fc.property(fc.array(actionArb, { maxLength: 40 }), (actions) => {
        const { server, screens, drain } = play(actions, 1);
        const [document = open()] = screens;
        const seen = viewDocument(document);
        const ended = drain(document);
        expect(ended.conflicts).toEqual([]);
        expect(sameList(seen, server.players)).toBe(true);
      }),
      { numRuns: 500 },
    );
  });
});
