import type { CSSProperties } from 'react';
import { joinClasses } from '@/components/ui/join-classes';
import { toneText, type Tone } from '@/components/ui/status-mark';
import { placeDates, placeToday } from './place-dates';

/** One date of the plan. `day` is YYYY-MM-DD, `dayLabel` as people read it; `note` stands under it in its tone. */
export type PlanDate = {
  id: string;
  label: string;
  day: string;
  dayLabel: string;
  note?: { tone: Tone; text: string } | undefined;
};

/**
 * The dates of a season on one line: an inked thread as far as today, a seam from there on, true to scale as far as the
 * labels allow. Where it is narrow the line runs downwards. Props: `label`, `dates` in rising order, `today` YYYY-MM-DD,
 * `todayLabel` ("today, 9 Sep").
 */
export function DatePlan({
  label,
  dates,
  today,
  todayLabel,
}: {
  label: string;
  dates: readonly PlanDate[];
  today: string;
  todayLabel: string;
}) {
  const days = dates.map((date) => date.day);
  const places = placeDates(days, dates.length > 6 ? 8 : 11);
  const now = placeToday(days, places, today);
  const next = dates.find((date) => date.day >= today);
  const running = now > 0 && now < 100;
  return (
    <div className="@container">
      <div className="relative @min-[50rem]:mx-12 @min-[50rem]:pt-5 @min-[50rem]:pb-16">
        <div aria-hidden="true" className="true-colour relative hidden h-4 @min-[50rem]:block">
          <span className="border-thread absolute inset-x-0 top-1/2 border-t-2 border-dashed" />
          <span
            className="bg-ink absolute top-1/2 left-0 h-1 -translate-y-1/2 rounded-full"
            style={{ width: `${now}%` }}
          />
          {running && (
            <span className="bg-damson absolute -top-4 h-18 w-0.5" style={{ left: `${now}%` }}>
              <span
                className={joinClasses(
                  'type-fine text-damson absolute -top-1 font-[600] whitespace-nowrap',
                  now > 80 ? 'right-2' : 'left-2',
                )}
              >
                {todayLabel}
              </span>
            </span>
          )}
        </div>
        <ol
          aria-label={label}
          className="@max-[50rem]:border-thread @max-[50rem]:ml-2 @max-[50rem]:border-l-2 @max-[50rem]:border-dashed"
        >
          {dates.map((date, at) => {
            const passed = date.day < today;
            const upNext = date === next;
            return (
              <li
                key={date.id}
                aria-current={upNext ? 'step' : undefined}
                className="relative @max-[50rem]:pb-3 @max-[50rem]:pl-5 @max-[50rem]:last:pb-0 @min-[50rem]:absolute @min-[50rem]:top-5 @min-[50rem]:w-0 @min-[50rem]:left-[var(--at)]"
                style={{ '--at': `${places[at] ?? 0}%` } as CSSProperties}
              >
                <span
                  aria-hidden="true"
                  className={joinClasses(
                    'true-colour absolute top-0.5 -left-2 size-4 rounded-full border-2 @min-[50rem]:top-0',
                    passed ? 'border-ink bg-ink' : upNext ? 'border-care bg-care' : 'border-ink bg-card',
                  )}
                />
                <div className="@min-[50rem]:absolute @min-[50rem]:top-6 @min-[50rem]:w-32 @min-[50rem]:-translate-x-1/2 @min-[50rem]:text-center">
                  <span className="type-small block font-[620]">
                    {date.label}
                    {passed && <span className="sr-only">, passed</span>}
                  </span>
                  <span className="type-small text-dusk block">{date.dayLabel}</span>
                  {date.note !== undefined && (
                    <span className={joinClasses('type-fine block font-[600]', toneText[date.note.tone])}>
                      {date.note.text}
                    </span>
                  )}
                </div>
              </li>
            );
          })}
        </ol>
        <p className="sr-only">{todayLabel}</p>
      </div>
    </div>
  );
}
