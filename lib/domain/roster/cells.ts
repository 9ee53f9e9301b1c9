import { garmentOf, isSizeField, type CellField, type RosterEntry } from './edit';
import type { RosterLine } from './player';

/** What a cell holds; empty when nothing was given. */
export function readCell(player: RosterLine, field: CellField): string {
  if (!isSizeField(field)) return player[field];
  const garment = garmentOf(field);
  return Object.hasOwn(player.sizes, garment) ? (player.sizes[garment] ?? '') : '';
}

/** The player with one cell changed; an empty size is taken out. The given player stays as it was. */
export function writeCell(player: RosterEntry, field: CellField, value: string): RosterEntry {
  if (!isSizeField(field)) return { ...player, [field]: value };
  const others = Object.entries(player.sizes).filter(([garment]) => garment !== garmentOf(field));
  const sizes = Object.fromEntries(value === '' ? others : [...others, [garmentOf(field), value]]);
  return { ...player, sizes };
}

/** Every cell of a player that holds something, own fields first, then sizes. */
export function listCells(player: RosterLine): CellField[] {
  const own = (['name', 'nameOnBack', 'number', 'role'] as const).filter((field) => player[field] !== '');
  const sizes = Object.keys(player.sizes).map((garment): CellField => `size:${garment}`);
  return [...own, ...sizes.filter((field) => readCell(player, field) !== '')];
}

/** The cells in which two players differ. */
export function listDifferentCells(one: RosterLine, other: RosterLine): CellField[] {
  const fields = new Set([...listCells(one), ...listCells(other)]);
  return [...fields].filter((field) => readCell(one, field) !== readCell(other, field));
}

/** Whether two players came with the same cells of a file beside them. */
export const sameExtra = (one: Record<string, string>, other: Record<string, string>): boolean =>
  Object.keys(one).length === Object.keys(other).length &&
  Object.entries(one).every(([key, value]) => Object.hasOwn(other, key) && other[key] === value);

/** Whether two players hold the same in every cell, and the same cells of a file beside them. */
export const isSameEntry = (one: RosterEntry, other: RosterEntry): boolean =>
  listDifferentCells(one, other).length === 0 && sameExtra(one.extra, other.extra);

/** A player nobody has written anything about yet. */
export const makeEmptyEntry = (id: string): RosterEntry => ({
  id,
  name: '',
  nameOnBack: '',
  number: '',
  role: '',
  sizes: {},
  extra: {},
});
