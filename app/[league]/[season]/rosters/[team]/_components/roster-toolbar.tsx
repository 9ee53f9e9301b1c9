import { useRef, type ReactNode } from 'react';
import { severityTone } from '@/components/status/finding-mark';
import { IconButton } from '@/components/ui/icon-button';
import { joinClasses } from '@/components/ui/join-classes';
import { SearchInput } from '@/components/ui/search-input';
import { StatusMark, toneText, toneWash } from '@/components/ui/status-mark';
import { StatusTag } from '@/components/ui/tag';
import type { CheckSummary, Severity } from '@/lib/domain/rules/finding';
import { countOf } from '@/lib/domain/text/count-of';

/**
 * The line above the grid: how many findings, which show only their players when pressed; what they were checked
 * against; undo and redo; the search; the save state. Props: `summary` null while nothing can be checked.
 */
export function RosterToolbar({
  summary,
  checkedAgainst,
  only,
  onOnly,
  undo,
  find,
  onFind,
  findOpen,
  onFindOpen,
  saveState,
}: {
  summary: CheckSummary | null;
  checkedAgainst: string;
  only: Severity | null;
  onOnly: (severity: Severity | null) => void;
  undo: { back: (() => void) | null; again: (() => void) | null } | null;
  find: string;
  onFind: (text: string) => void;
  findOpen: boolean;
  onFindOpen: (open: boolean) => void;
  saveState: ReactNode;
}) {
  const counts: [Severity, number][] = summary
    ? [
        ['blocker', summary.blockers],
        ['caution', summary.cautions],
        ['note', summary.notes],
      ]
    : [];
  const opener = useRef<HTMLButtonElement>(null);
  const shown = counts.filter(([severity, count]) => count > 0 || only === severity);
  return (
    <div className="print:hidden">
      <div className="flex flex-wrap items-center gap-x-3 gap-y-2 px-4 py-2.5">
        {summary !== null && shown.length === 0 && summary.players > 0 && (
          <StatusTag tone="set">nothing to fix</StatusTag>
        )}
        {shown.map(([severity, count]) => (
          <button
            key={severity}
            type="button"
            aria-pressed={only === severity}
            title={only === severity ? 'Show all players' : `Show only players with a ${severity}`}
            onClick={() => onOnly(only === severity ? null : severity)}
            className={joinClasses(
              'type-fine true-colour inline-flex min-h-6 items-center gap-1.5 rounded px-2 py-0.5 font-[600] whitespace-nowrap max-sm:min-h-11 max-sm:px-3',
              toneText[severityTone[severity]],
              toneWash[severityTone[severity]],
              only === severity ? 'outline-2 outline-current' : 'hover:outline-1 hover:outline-current',
            )}
          >
            <StatusMark tone={severityTone[severity]} size={13} />
            {countOf(count, severity)}
          </button>
        ))}
        <p className="text-dusk min-w-0 grow basis-40 max-sm:order-5 max-sm:basis-full">{checkedAgainst}</p>
        <div className={joinClasses('ml-auto flex items-center gap-0.5', undo !== null && 'max-sm:order-7')}>
          {undo !== null && (
            <>
              <IconButton
                icon="undo"
                label="Undo (Ctrl Z)"
                aria-disabled={undo.back === null}
                onClick={() => undo.back?.()}
                className="aria-disabled:opacity-40"
              />
              <IconButton
                icon="redo"
                label="Redo (Ctrl Shift Z)"
                aria-disabled={undo.again === null}
                onClick={() => undo.again?.()}
                className="aria-disabled:opacity-40"
              />
            </>
          )}
          <IconButton
            ref={opener}
            icon="search"
            label="Find a player"
            aria-expanded={findOpen}
            onClick={() => onFindOpen(!findOpen)}
          />
        </div>
        <div className="empty:hidden max-sm:order-6 max-sm:grow">{saveState}</div>
      </div>
      {findOpen && (
        <div className="border-hem flex flex-wrap items-center gap-3 border-t px-4 py-2.5">
          <SearchInput
            label="Find a player"
            autoFocus
            value={find}
            onChange={(event) => onFind(event.target.value)}
            onKeyDown={(event) => {
              if (event.key !== 'Escape') return;
              onFindOpen(false);
              opener.current?.focus();
            }}
            className="sm:w-72"
          />
        </div>
      )}
    </div>
  );
}
