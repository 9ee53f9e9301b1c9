import { formatDay, formatTime } from '@/lib/domain/dates/format';
import { toDay } from '@/lib/domain/dates/zone';
import { countOf } from '@/lib/domain/text/count-of';
import type { HistoryLine } from '@/lib/use-cases/history-reading';

/** The events by day, newest first; the single changes of one are folded away until they are asked for. */
export function EventList({
  lines,
  timeZone,
  year,
}: {
  lines: readonly HistoryLine[];
  timeZone: string;
  year: number;
}) {
  const days = [...new Set(lines.map((line) => toDay(line.at, timeZone)))];
  return (
    <div className="border-hem border-t">
      {days.map((day) => (
        <section key={day} aria-labelledby={`day-${day}`}>
          <h2 id={`day-${day}`} className="type-label bg-linen px-4 py-1.5">
            {formatDay(day, year)}
          </h2>
          <ol className="divide-hem divide-y">
            {lines
              .filter((line) => toDay(line.at, timeZone) === day)
              .map((line) => (
                <li key={line.id} className="grid grid-cols-[3.25rem_minmax(0,1fr)] gap-x-2 px-4 py-2.5">
                  <time dateTime={line.at.toISOString()} className="text-dusk">
                    {formatTime(line.at, timeZone)}
                  </time>
                  <div className="min-w-0">
                    <p className="break-words">
                      <strong>{line.who}</strong> {line.what}
                    </p>
                    {line.changes.length > 0 && <Changes line={line} />}
                  </div>
                </li>
              ))}
          </ol>
        </section>
      ))}
    </div>
  );
}

function Changes({ line }: { line: HistoryLine }) {
  return (
    <details className="mt-0.5">
      <summary className="type-small text-damson max-sm:min-h-11 max-sm:py-2.5">
        {countOf(line.changes.length, 'change')}
      </summary>
      <ul className="type-small mt-1 grid gap-1">
        {line.changes.map(({ what, from, to }, at) => (
          <li key={at} className="break-words">
            <span className="text-dusk">{what}</span>
            {from !== '' && (
              <>
                {' '}
                <del className="decoration-thread">
                  <span className="sr-only">from </span>
                  {from}
                </del>
              </>
            )}
            {to !== '' && (
              <>
                {' '}
                <span aria-hidden="true">→</span> <span className="sr-only">to </span>
                {to}
              </>
            )}
          </li>
        ))}
      </ul>
    </details>
  );
}
