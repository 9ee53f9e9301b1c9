import { Card } from '@/components/ui/card';
import { Notice } from '@/components/ui/notice';
import { sixAndNineNote, type DigitPull } from '@/lib/domain/packing/pull-digits';
import { countOf } from '@/lib/domain/text/count-of';

/** Which digits to take: a card per number colour with the ten digits and how many of each. Props: `pulls`. */
export function DigitPulls({ pulls }: { pulls: readonly DigitPull[] }) {
  return pulls.map((pull) => (
    <Card
      key={`${pull.number} ${pull.outline}`}
      title={
        <span className="inline-flex flex-wrap items-center gap-2">
          Digits to pull in <Swatch fill={pull.number} outline={pull.outline} />
          <span className="type-code text-dusk">
            {pull.number}
            {pull.outline !== null && ` on ${pull.outline}`}
          </span>
        </span>
      }
      aside={`${pull.total} for ${countOf(pull.pieces, 'piece')}`}
    >
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(5.5rem,1fr))] gap-2">
        {[...pull.digits, ...pull.others].map(({ character, count }) => (
          <li
            key={character}
            className={`border-hem rounded-control flex items-baseline justify-between border px-3 py-2 ${count === 0 ? 'text-dusk' : ''}`}
          >
            <span className="type-jersey text-3xl">{character}</span>
            <span className="font-[600]">
              <span className="sr-only">: </span>
              {count}
            </span>
          </li>
        ))}
      </ul>
      {pull.withoutNumber > 0 && (
        <div className="mt-3">
          <Notice tone="care">
            {countOf(pull.withoutNumber, 'piece')} should have a number, but the player has none.
          </Notice>
        </div>
      )}
      <p className="type-fine text-dusk mt-3">
        For {pull.wornBy.map((wearer) => `${wearer.team} (${wearer.kitKind}, ${wearer.colour})`).join(', ')}.{' '}
        {sixAndNineNote}
      </p>
    </Card>
  ));
}

const Swatch = ({ fill, outline }: { fill: string; outline: string | null }) => (
  <svg aria-hidden viewBox="0 0 16 16" className="border-thread size-4 shrink-0 rounded-xs border">
    <path fill={outline ?? fill} d="M0 0h16v16H0z" />
    <path fill={fill} d="M3 3h10v10H3z" />
  </svg>
);
