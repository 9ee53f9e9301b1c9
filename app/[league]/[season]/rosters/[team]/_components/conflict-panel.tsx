import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { nameOfCell, isSizeField, garmentOf, playerOfEdit } from '@/lib/domain/roster/edit';
import type { OpenConflict } from '@/lib/domain/roster/document';
import type { Garment } from '@/lib/domain/roster/player';
import { countOf } from '@/lib/domain/text/count-of';

/** Both values of every cell that two people changed, and the choice between them. */
export function ConflictPanel({
  conflicts,
  nameOf,
  garments,
  onKeepMine,
  onTakeTheirs,
}: {
  conflicts: readonly OpenConflict[];
  nameOf: (playerId: string) => string | undefined;
  garments: readonly Garment[];
  onKeepMine: (conflict: OpenConflict) => void;
  onTakeTheirs: (conflict: OpenConflict) => void;
}) {
  if (conflicts.length === 0) return null;
  return (
    <div className="mb-4 print:hidden">
      <Notice
        tone="care"
        live="polite"
        title={`${countOf(conflicts.length, 'change')} of yours met another person’s`}
      >
        <p>Nothing is lost. Choose which stays.</p>
        <ul className="mt-2 grid gap-2">
          {conflicts.map((conflict) => {
            const { edit } = conflict;
            const id = playerOfEdit(edit);
            const name = nameOf(id) ?? (conflict.lastKnown?.name || 'a player');
            const field = edit.kind === 'set' ? edit.field : edit.kind;
            return (
              <li
                key={`${id} ${field}`}
                className="border-hem flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-t pt-2"
              >
                <span>
                  <strong>{name}</strong>, {describe(conflict, garments)}
                </span>
                <span className="flex gap-2">
                  <Button size="sm" onClick={() => onKeepMine(conflict)}>
                    Keep mine
                    <span className="sr-only"> for {name}</span>
                  </Button>
                  <Button size="sm" onClick={() => onTakeTheirs(conflict)}>
                    Take theirs
                    <span className="sr-only"> for {name}</span>
                  </Button>
                </span>
              </li>
            );
          })}
        </ul>
      </Notice>
    </div>
  );
}

function describe({ edit, theirs }: OpenConflict, garments: readonly Garment[]) {
  if (edit.kind !== 'set') return 'whom you removed: they changed the player first.';
  const { field } = edit;
  const cell = isSizeField(field)
    ? `${garments.find(({ code }) => code === garmentOf(field))?.name ?? garmentOf(field)} size`
    : nameOfCell(field);
  const mine = <Value text={edit.to} />;
  return theirs.is === 'cell' ? (
    <>
      {cell}: yours {mine}, theirs <Value text={theirs.value} />
    </>
  ) : (
    <>
      {cell}: yours {mine}; they removed the player. Keeping yours brings the player back.
    </>
  );
}

const Value = ({ text }: { text: string }) => (
  <span className="type-code bg-card rounded px-1.5 py-0.5 break-words">{text === '' ? 'empty' : text}</span>
);
