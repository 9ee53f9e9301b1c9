import { SelectField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import type { AmbiguousLine } from '@/lib/domain/roster/import/merge-roster';
import { countOf } from '@/lib/domain/text/count-of';

export type Decision = { as: 'new' } | { as: 'player'; id: string };

/** Lines that may be a player who is there already: the person says which, since a guess could lose one. */
export function DoubtfulLines({
  lines,
  decisions,
  onDecide,
}: {
  lines: readonly AmbiguousLine[];
  decisions: ReadonlyMap<number, Decision>;
  /** With null what was said is taken back. */
  onDecide: (row: number, decision: Decision | null) => void;
}) {
  if (lines.length === 0) return null;
  return (
    <div className="mt-3">
      <Notice
        tone="care"
        title={`Who ${lines.length === 1 ? 'is' : 'are'} ${countOf(lines.length, 'line')}?`}
      >
        <ul className="mt-1 grid gap-3">
          {lines.map((line) => (
            <li key={line.row}>
              <SelectField
                label={`${line.incoming.line.name || 'A line without a name'}: ${line.reason}`}
                placeholder="Say who it is"
                value={valueOf(decisions.get(line.row))}
                options={[
                  { value: 'new', label: 'Somebody new' },
                  ...line.candidates.map((player) => ({
                    value: player.id,
                    label: `${player.name}${player.number === '' ? '' : `, number ${player.number}`}`,
                  })),
                ]}
                onChange={(event) => {
                  const { value } = event.target;
                  onDecide(
                    line.row,
                    value === '' ? null : value === 'new' ? { as: 'new' } : { as: 'player', id: value },
                  );
                }}
              />
            </li>
          ))}
        </ul>
      </Notice>
    </div>
  );
}

const valueOf = (decision: Decision | undefined): string =>
  decision === undefined ? '' : decision.as === 'new' ? 'new' : decision.id;
