import type { KeyboardEvent } from 'react';
import { joinClasses } from '@/components/ui/join-classes';
import { StatusMark, toneText } from '@/components/ui/status-mark';
import { severityTone } from '@/components/status/finding-mark';
import { nameOfCell } from '@/lib/domain/roster/edit';
import type { ChangeMark } from '@/lib/domain/roster/document';
import type { Finding } from '@/lib/domain/rules/finding';
import { capitalise, joinWords } from '@/lib/domain/text/sentence';
import { leadOfSuggestions } from './cell-findings';

/**
 * What there is to do about a player: each finding as a sentence with values that would put it right, and what somebody
 * else has just changed. Props: `id` for the cells it describes, `findings`, `marks`, `onUse` (null while the roster
 * can't be edited).
 */
export function TodoCell({
  id,
  findings,
  marks,
  onUse,
}: {
  id: string;
  findings: readonly Finding[];
  marks: readonly ChangeMark[];
  onUse: ((finding: Finding, value: string) => void) | null;
}) {
  return (
    <div id={id} className="type-small grid gap-0.5 text-left" onKeyDown={walkButtons}>
      {findings.map((finding, at) => (
        <p
          key={`${finding.code}${finding.garment ?? ''}${at}`}
          className={toneText[severityTone[finding.severity]]}
        >
          <StatusMark
            tone={severityTone[finding.severity]}
            size={12}
            label={finding.severity}
            className="mr-1.5 -mt-0.5 inline-block sm:hidden"
          />
          {finding.message}
          {onUse !== null && finding.suggestions.length > 0 && (
            <>
              {` ${leadOfSuggestions(finding)} `}
              <span
                className={joinClasses(
                  'max-sm:flex max-sm:flex-wrap max-sm:gap-2 max-sm:pt-1.5',
                  finding.field === 'number' && 'sm:whitespace-nowrap',
                )}
              >
                {finding.suggestions.map((value, place) => (
                  <span key={value}>
                    {place > 0 && (
                      <span className="max-sm:hidden">{finding.field === 'nameOnBack' ? ' or ' : ' '}</span>
                    )}
                    <button
                      type="button"
                      tabIndex={-1}
                      data-suggestion
                      onClick={(event) => {
                        event.stopPropagation();
                        onUse(finding, value);
                      }}
                      className={joinClasses(
                        'rounded-[3px] font-[640] underline decoration-1 underline-offset-3 hover:decoration-2',
                        'max-sm:border-thread max-sm:min-h-11 max-sm:min-w-11 max-sm:border max-sm:px-2.5 max-sm:no-underline',
                        finding.field === 'nameOnBack' && 'type-code',
                      )}
                    >
                      {value}
                    </button>
                  </span>
                ))}
              </span>
            </>
          )}
        </p>
      ))}
      {marks.length > 0 && (
        <p className="text-damson">
          {capitalise(joinWords([...new Set(marks.map(({ field }) => nameOfCell(field)))]))} changed
          {marks[0]?.by != null && ` by ${marks[0].by}`} just now.
        </p>
      )}
    </div>
  );
}

/** Arrow keys go from one suggestion to the next; Escape goes back to the cell. */
function walkButtons(event: KeyboardEvent<HTMLDivElement>) {
  const target = event.target as HTMLElement;
  if (!target.matches('[data-suggestion]')) return;
  const buttons = [...event.currentTarget.querySelectorAll<HTMLElement>('[data-suggestion]')];
  const move = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 }[event.key];
  if (event.key === 'Escape') target.closest('td')?.focus();
  else if (move !== undefined) buttons[buttons.indexOf(target) + move]?.focus();
  else {
    // Enter and space press the button, and nothing of it is for the grid.
    if (event.key === 'Enter' || event.key === ' ') event.stopPropagation();
    return;
  }
  event.preventDefault();
  event.stopPropagation();
}
