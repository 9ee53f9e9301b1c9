import { joinClasses } from '@/components/ui/join-classes';
import type { Kit } from '@/lib/domain/kit/kit';
import { body, garmentBox, leftSleeve, rightSleeve } from './garment-outlines';

/** xs 30 px for a matrix, sm 36 px for a table row, md 46 px for a list, lg 62 px for a page head, xl 104 px. */
export type YokeTileSize = 'xs' | 'sm' | 'md' | 'lg' | 'xl';

const widths: Record<YokeTileSize, string> = {
  xs: 'w-7.5',
  sm: 'w-9',
  md: 'w-11.5',
  lg: 'w-15.5',
  xl: 'w-26',
};

/**
 * A team as a small raglan garment in its real colours; a thread outline keeps white on white and black on black in
 * sight. Props: `kit`, `number` to show (none leaves the garment plain), `size`, and `label` ("Otters, home") when no
 * words beside it name the team; without it the tile is hidden from screen readers.
 */
export function YokeTile({
  kit,
  number,
  size = 'sm',
  label,
  className,
}: {
  kit: Pick<Kit, 'body' | 'sleeves' | 'number' | 'outline'>;
  number?: string | undefined;
  size?: YokeTileSize | undefined;
  label?: string | undefined;
  className?: string | undefined;
}) {
  const name =
    label === undefined
      ? { 'aria-hidden': true as const }
      : { role: 'img', 'aria-label': number === undefined ? label : `${label}, number ${number}` };
  return (
    <svg
      {...name}
      focusable="false"
      viewBox={garmentBox}
      className={joinClasses('true-colour inline-block h-auto shrink-0', widths[size], className)}
    >
      <g className="stroke-thread" strokeWidth="1" strokeLinejoin="round" vectorEffect="non-scaling-stroke">
        <path d={leftSleeve} fill={kit.sleeves} vectorEffect="non-scaling-stroke" />
        <path d={rightSleeve} fill={kit.sleeves} vectorEffect="non-scaling-stroke" />
        <path d={body} fill={kit.body} vectorEffect="non-scaling-stroke" />
      </g>
      {number !== undefined && number !== '' && (
        <text
          x="50"
          y={60}
          textAnchor="middle"
          fontSize={number.length > 2 ? 36 : 44}
          fill={kit.number}
          {...(kit.outline === null
            ? {}
            : { stroke: kit.outline, strokeWidth: 5, strokeLinejoin: 'round', paintOrder: 'stroke' })}
          className="type-jersey"
        >
          {number}
        </text>
      )}
    </svg>
  );
}
