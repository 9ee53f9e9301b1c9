import type { Kit } from '@/lib/domain/kit/kit';
import { mmPerPoint } from '../text/fit-text';
import type { Canvas, PathStep, Stroke } from './canvas';
import { thread } from './house-style';

/** The garment of the tile in a box 100 wide and 87 high: the same outline that the screens draw. */
const leftSleeve: PathStep[] = [
  ['M', 37.8, 0],
  ['C', 21, 0.8, 5.5, 10, 0, 27],
  ['L', 10.4, 44.8],
  ['L', 25, 37.3],
  ['L', 24, 24.4],
  ['Z'],
];
const rightSleeve: PathStep[] = [
  ['M', 62.2, 0],
  ['C', 79, 0.8, 94.5, 10, 100, 27],
  ['L', 89.6, 44.8],
  ['L', 75, 37.3],
  ['L', 76, 24.4],
  ['Z'],
];
const body: PathStep[] = [
  ['M', 37.8, 0],
  ['C', 45.93, 5, 54.07, 5, 62.2, 0],
  ['L', 76, 24.4],
  ['L', 73.2, 87],
  ['L', 26.8, 87],
  ['L', 24, 24.4],
  ['Z'],
];

/** Height of a tile in mm for its width. */
export const tileHeight = (width: number): number => width * 0.87;

/**
 * Draws a team's garment in its kit's colours, `width` mm wide with its top left corner at `x`, `y`. `number` is set on
 * the chest, made smaller until it fits between the seams; an outline in thread keeps white on white in sight.
 */
export function drawYokeTile(
  canvas: Canvas,
  tile: { x: number; y: number; width: number },
  kit: Pick<Kit, 'body' | 'sleeves' | 'number' | 'outline'>,
  number = '',
): void {
  const scale = tile.width / 100;
  const stroke: Stroke = { colour: thread, width: Math.max(0.2, scale) };
  const place = (steps: readonly PathStep[]) => steps.map((step) => placeStep(step, tile, scale));
  canvas.path(place(leftSleeve), { fill: kit.sleeves, stroke });
  canvas.path(place(rightSleeve), { fill: kit.sleeves, stroke });
  canvas.path(place(body), { fill: kit.body, stroke });
  if (number === '') return;
  const widest = 40 * scale;
  const natural = canvas.type.shape('figure', number).width * mmPerPoint;
  const size = Math.min((44 * scale) / mmPerPoint, widest / natural);
  const base = tile.y + 46 * scale + size * mmPerPoint * 0.344; // half of Saira's capital height of 0.688 em
  const outline = kit.outline === null ? undefined : { colour: kit.outline, width: 5 * scale };
  canvas.text(tile.x + 50 * scale, base, number, {
    style: 'figure',
    size,
    colour: kit.number,
    align: 'centre',
    outline,
  });
}

function placeStep(step: PathStep, at: { x: number; y: number }, scale: number): PathStep {
  const x = (value: number) => at.x + value * scale;
  const y = (value: number) => at.y + value * scale;
  switch (step[0]) {
    case 'M':
    case 'L':
      return [step[0], x(step[1]), y(step[2])];
    case 'C':
      return ['C', x(step[1]), y(step[2]), x(step[3]), y(step[4]), x(step[5]), y(step[6])];
    case 'Z':
      return ['Z'];
  }
}
