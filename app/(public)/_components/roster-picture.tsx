import { FindingSummary, severityTone } from '@/components/status/finding-mark';
import { joinClasses } from '@/components/ui/join-classes';
import { toneText, toneWash } from '@/components/ui/status-mark';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { pictureRoster, pictureRules } from './picture-roster';

const rowsShown = [1, 2, 4];

/** A few lines of a roster with what the check really says about them. */
export function RosterPicture() {
  const { findings, summary } = checkRoster(pictureRules, pictureRoster, []);
  return (
    <div>
      <FindingSummary summary={summary} />
      <ul className="mt-3">
        {rowsShown.map((row) => {
          const player = pictureRoster[row];
          const finding = findings.find((one) => one.row === row);
          if (player === undefined) return null;
          const tone = finding === undefined ? undefined : severityTone[finding.severity];
          const marked = (field: string) =>
            tone !== undefined && finding?.field === field && joinClasses(toneWash[tone], 'rounded-sm');
          return (
            <li key={row} className="border-hem border-t py-2">
              <div className="flex items-center justify-between gap-3">
                <span className="min-w-0 truncate">{player.name}</span>
                <span className="flex items-center gap-2">
                  <span className={joinClasses('type-code px-1.5 py-0.5', marked('nameOnBack'))}>
                    {player.nameOnBack}
                  </span>
                  <span
                    className={joinClasses(
                      'type-jersey min-w-9 px-1.5 py-0.5 text-right text-[1.375rem]',
                      marked('number'),
                    )}
                  >
                    {player.number}
                  </span>
                </span>
              </div>
              {finding !== undefined && tone !== undefined && (
                <p className={joinClasses('type-small mt-0.5', toneText[tone])}>{finding.message}</p>
              )}
            </li>
          );
        })}
      </ul>
    </div>
  );
}
