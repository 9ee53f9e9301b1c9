/** A cell of the grid: a row by its player's id (`newRow` for the blank one at the end) and a column by its place. */
export type Place = { row: string; column: number };

/** The blank row at the end of the grid, where a new player is typed. */
export const newRow = 'new';

type Extent = { rows: readonly string[]; columns: number };
export type Direction = 'left' | 'right' | 'up' | 'down' | 'next' | 'previous';

/** The neighbour of a place, the place itself at the edge; `next` and `previous` go on in the next row, null at the end. */
export function step(place: Place, direction: Direction, { rows, columns }: Extent): Place | null {
  const at = Math.max(0, rows.indexOf(place.row));
  const clamp = (row: number, column: number): Place => ({
    row: rows[Math.min(rows.length - 1, Math.max(0, row))] ?? place.row,
    column: Math.min(columns - 1, Math.max(0, column)),
  });
  switch (direction) {
    case 'left':
      return clamp(at, place.column - 1);
    case 'right':
      return clamp(at, place.column + 1);
    case 'up':
      return clamp(at - 1, place.column);
    case 'down':
      return clamp(at + 1, place.column);
    case 'next':
      if (place.column + 1 < columns) return clamp(at, place.column + 1);
      return at + 1 < rows.length ? clamp(at + 1, 0) : null;
    case 'previous':
      if (place.column > 0) return clamp(at, place.column - 1);
      return at > 0 ? clamp(at - 1, columns - 1) : null;
  }
}

/** Where a key leads from a place, or null when it is no key that moves. Ctrl or Cmd goes to the corner. */
export function readMove(
  place: Place,
  key: string,
  mods: { control: boolean },
  extent: Extent,
): Place | null {
  const last = extent.columns - 1;
  const { rows } = extent;
  switch (key) {
    case 'ArrowLeft':
      return mods.control ? { ...place, column: 0 } : step(place, 'left', extent);
    case 'ArrowRight':
      return mods.control ? { ...place, column: last } : step(place, 'right', extent);
    case 'ArrowUp':
      return mods.control ? { ...place, row: rows[0] ?? place.row } : step(place, 'up', extent);
    case 'ArrowDown':
      return mods.control ? { ...place, row: rows.at(-1) ?? place.row } : step(place, 'down', extent);
    case 'Home':
      return mods.control ? { row: rows[0] ?? place.row, column: 0 } : { ...place, column: 0 };
    case 'End':
      return mods.control ? { row: rows.at(-1) ?? place.row, column: last } : { ...place, column: last };
    case 'PageUp':
      return { ...place, row: rows[Math.max(0, rows.indexOf(place.row) - 10)] ?? place.row };
    case 'PageDown':
      return { ...place, row: rows[Math.min(rows.length - 1, rows.indexOf(place.row) + 10)] ?? place.row };
    default:
      return null;
  }
}
