import { joinClasses } from '@/components/ui/join-classes';
import { StatusMark } from '@/components/ui/status-mark';
import { steps, stepTitles, type Step } from './draft';

/** The steps in order; those passed can be gone back to. Props: `step` now, `blamed` (with a fault), `onGo`. */
export function StepList({
  step,
  blamed,
  onGo,
}: {
  step: Step;
  blamed: Step | undefined;
  onGo: (step: Step) => void;
}) {
  const reached = steps.indexOf(step);
  return (
    <nav aria-label="Steps">
      <ol className="flex flex-wrap gap-x-1 gap-y-1">
        {steps.map((entry, at) => {
          const tone = entry === blamed ? 'stop' : at < reached ? 'set' : 'wait';
          const label = (
            <>
              <StatusMark
                tone={tone}
                label={tone === 'stop' ? 'Needs another look' : tone === 'set' ? 'Done' : 'Not yet'}
              />
              {at + 1}. {stepTitles[entry]}
            </>
          );
          const look = 'touch type-small rounded-control inline-flex items-center gap-1.5 px-2.5';
          return (
            <li key={entry} aria-current={entry === step ? 'step' : undefined}>
              {entry === step ? (
                <span className={joinClasses(look, 'bg-linen font-[620]')}>{label}</span>
              ) : at < reached || entry === blamed ? (
                <button
                  type="button"
                  onClick={() => onGo(entry)}
                  className={joinClasses(
                    look,
                    'text-damson hover:bg-linen font-[560] underline underline-offset-3',
                  )}
                >
                  {label}
                </button>
              ) : (
                <span className={joinClasses(look, 'text-dusk')}>{label}</span>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
