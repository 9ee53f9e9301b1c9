import { describe, expect, it } from 'vitest';
import {
  newRow,
  readMove,
  step,
  type Place,
} from '@/app/[league]/[season]/rosters/[team]/_components/grid-place';
import {
  arrange,
  matchesPlayer,
  sortRows,
} from '@/app/[league]/[season]/rosters/[team]/_components/row-order';
import { makeId } from '@/app/[league]/[season]/rosters/[team]/_components/make-id';
import { makeEmptyEntry } from '@/lib/domain/roster/cells';

const extent = { rows: ['a', 'b', newRow], columns: 3 };
const at = (row: string, column: number): Place => ({ row, column });

describe('moving in the grid', () => {
  it('stops at the edges with arrow keys', () => {
    expect(step(at('a', 0), 'left', extent)).toEqual(at('a', 0));
    expect(step(at('a', 0), 'up', extent)).toEqual(at('a', 0));
    expect(step(at(newRow, 2), 'down', extent)).toEqual(at(newRow, 2));
    expect(step(at('a', 1), 'down', extent)).toEqual(at('b', 1));
  });

  it('goes on in the next row with Tab, back with Shift Tab, and leaves at the ends', () => {
    expect(step(at('a', 2), 'next', extent)).toEqual(at('b', 0));
    expect(step(at('b', 0), 'previous', extent)).toEqual(at('a', 2));
    expect(step(at(newRow, 2), 'next', extent)).toBeNull();
    expect(step(at('a', 0), 'previous', extent)).toBeNull();
  });

  it('reaches the corners with Control, and knows no other keys', () => {
    expect(readMove(at('b', 1), 'Home', { control: false }, extent)).toEqual(at('b', 0));
    expect(readMove(at('b', 1), 'End', { control: true }, extent)).toEqual(at(newRow, 2));
    expect(readMove(at('b', 1), 'ArrowUp', { control: true }, extent)).toEqual(at('a', 1));
    expect(readMove(at('b', 1), 'Enter', { control: false }, extent)).toBeNull();
  });

  it('goes from a player who is gone to the first', () => {
    expect(step(at('gone', 1), 'down', extent)).toEqual(at('b', 1));
  });
});

describe('looking at a roster in another order', () => {
  const players = [
    { ...makeEmptyEntry('a'), name: 'Öland', number: '10' },
    { ...makeEmptyEntry('b'), name: 'adisa', number: 'seven' },
    { ...makeEmptyEntry('c'), name: 'Zellweg', number: '07' },
    { ...makeEmptyEntry('d'), name: '', number: '' },
  ];

  it('sorts numbers by value with unreadable ones last either way, and names whatever their case and accents', () => {
    expect(sortRows(players, { field: 'number', down: false })).toEqual(['c', 'a', 'b', 'd']);
    expect(sortRows(players, { field: 'number', down: true })).toEqual(['a', 'c', 'b', 'd']);
    expect(sortRows(players, { field: 'name', down: false })).toEqual(['d', 'b', 'a', 'c']);
  });

  it('leaves the order of the roster alone and puts players who joined since at the end', () => {
    expect(arrange(players, ['c', 'a']).map(({ id }) => id)).toEqual(['c', 'a', 'b', 'd']);
    expect(arrange(players, null)).toEqual(players);
  });

  it('finds a player by any cell, accents aside', () => {
    expect(players.filter((player) => matchesPlayer(player, 'oland 10')).map(({ id }) => id)).toEqual(['a']);
  });
});

describe('an id made in the browser', () => {
  it('is one the server takes, and never the same twice', () => {
    const ids = Array.from({ length: 50 }, makeId);
    for (const id of ids)
      expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    expect(new Set(ids).size).toBe(50);
  });
});
