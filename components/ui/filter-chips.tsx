import { joinClasses } from './join-classes';

/**
 * Filters of a list with how many each keeps: All 32, Blocked 6. Props: `label` of the group, `chips`, `chosen` id,
 * `onChoose(id)`. One is always chosen.
 */
export function FilterChips<Id extends string>({
  label,
  chips,
  chosen,
  onChoose,
}: {
  label: string;
  chips: readonly { id: Id; label: string; count?: number | undefined }[];
  chosen: Id;
  onChoose: (id: Id) => void;
}) {
  return (
    <div role="group" aria-label={label} className="flex flex-wrap gap-2 print:hidden">
      {chips.map((chip) => (
        <button
          key={chip.id}
          type="button"
          aria-pressed={chip.id === chosen}
          onClick={() => onChoose(chip.id)}
          className={joinClasses(
            'touch type-small sm:pointer-fine:min-h-8 rounded-full border px-3 py-0.5 max-w-full text-left font-[560] break-words',
            chip.id === chosen
              ? 'border-damson bg-damson-wash text-damson-deep'
              : 'border-hem bg-card text-ink hover:border-thread',
          )}
        >
          {chip.label}
          {chip.count !== undefined && <span> {chip.count}</span>}
        </button>
      ))}
    </div>
  );
}
