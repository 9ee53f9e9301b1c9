/** Where a label stands on the rail: `line` and `column` count from 0, ten numbers to a line. */
export type RailPlace = { line: number; column: number };

/**
 * Lays labels out in lines of ten by their value, as on a number line, so that 14 always stands under 4. 00 stands
 * before 0, which moves everything one column to the right; labels with a leading zero, such as 07, get lines of their
 * own in front, since 7 may be on the rail too. Lines without a label are left out. Labels that are not digits come
 * last, ten to a line.
 */
export function layOutRail(labels: readonly string[]): Map<string, RailPlace> {
  const shift = labels.includes('00') ? 1 : 0;
  const keyed = labels.map((label) => ({ label, ...keyOf(label, shift) }));
  const lines = [...new Set(keyed.map((one) => one.group))].sort((a, b) => a - b);
  const others = { count: 0 };
  return new Map(
    keyed.map(({ label, group, column }) => {
      const line = lines.indexOf(group);
      if (group !== last) return [label, { line, column }];
      const at = others.count++;
      return [label, { line: line + Math.floor(at / 10), column: (at % 10) + shift }];
    }),
  );
}

const last = Number.MAX_SAFE_INTEGER;

function keyOf(label: string, shift: number): { group: number; column: number } {
  if (label === '00') return { group: 0, column: 0 };
  if (!/^\d{1,9}$/.test(label)) return { group: last, column: 0 };
  const value = Number(label);
  const column = (value % 10) + shift;
  const led = label.length > 1 && label.startsWith('0');
  return led
    ? { group: Math.floor(value / 10) - 100 * label.length - 1e8, column }
    : { group: Math.floor(value / 10), column };
}

/**
 * The label an arrow key leads to from this one, or the same at the edge. Left and right follow the order of the
 * labels; up and down keep the column and skip lines that have nothing there.
 */
export function stepOnRail(
  labels: readonly string[],
  places: ReadonlyMap<string, RailPlace>,
  from: string,
  key: string,
): string {
  const at = labels.indexOf(from);
  const here = places.get(from);
  if (at === -1 || here === undefined) return labels[0] ?? from;
  switch (key) {
    case 'ArrowRight':
      return labels[at + 1] ?? from;
    case 'ArrowLeft':
      return labels[at - 1] ?? from;
    case 'Home':
      return labels[0] ?? from;
    case 'End':
      return labels.at(-1) ?? from;
    case 'ArrowDown':
      return nearest(labels, places, here, (line) => line > here.line) ?? from;
    case 'ArrowUp':
      return nearest(labels, places, here, (line) => line < here.line) ?? from;
    default:
      return from;
  }
}

function nearest(
  labels: readonly string[],
  places: ReadonlyMap<string, RailPlace>,
  here: RailPlace,
  keeps: (line: number) => boolean,
): string | undefined {
  return labels
    .flatMap((label) => {
      const place = places.get(label);
      if (place === undefined || place.column !== here.column || !keeps(place.line)) return [];
      return [{ label, away: Math.abs(place.line - here.line) }];
    })
    .sort((a, b) => a.away - b.away)[0]?.label;
}
