import { Button } from '@/components/ui/button';
import { StatusMark, type Tone } from '@/components/ui/status-mark';
import { formatShortDay, formatTime } from '@/lib/domain/dates/format';
import { toDay } from '@/lib/domain/dates/zone';
import type { SaveState } from './roster-session';

/** One line that says whether what was typed is safe. Props: `save`, `unsaved` edits, `today`, `timeZone`, `signIn` address, `onRetry`. */
export function SaveStateLine({
  save,
  unsaved,
  today,
  timeZone,
  signIn,
  onRetry,
}: {
  save: SaveState;
  unsaved: number;
  today: Date;
  timeZone: string;
  signIn: string;
  onRetry: () => void;
}) {
  const { tone, words } = describe(save, unsaved, today, timeZone);
  return (
    <div className="type-small text-dusk flex flex-wrap items-center gap-x-2">
      {/* Only trouble is read aloud: a word after each cell would talk over the next one. */}
      <span role={tone === null ? undefined : 'status'} className="inline-flex items-center gap-1.5">
        {tone !== null && <StatusMark tone={tone} size={13} />}
        {words}
      </span>
      {save.is === 'signed out' && (
        <a
          href={signIn}
          target="_blank"
          rel="noreferrer"
          className="text-damson font-[560] underline underline-offset-3"
        >
          Sign in in a new tab
        </a>
      )}
      {(save.is === 'offline' || save.is === 'refused') && unsaved > 0 && (
        <Button size="sm" look="quiet" onClick={onRetry}>
          Try now
        </Button>
      )}
    </div>
  );
}

/** The time when it was today, else the day. */
const describeTime = (at: Date, today: Date, timeZone: string): string =>
  at < today && toDay(at, timeZone) !== toDay(today, timeZone)
    ? formatShortDay(toDay(at, timeZone))
    : formatTime(at, timeZone);

function describe(
  save: SaveState,
  unsaved: number,
  today: Date,
  timeZone: string,
): { tone: Tone | null; words: string } {
  switch (save.is) {
    case 'offline':
      return { tone: 'care', words: 'Not saved: no connection, trying again' };
    case 'signed out':
      return { tone: 'care', words: 'Not saved: your session has ended. What you typed stays here.' };
    case 'refused':
      return { tone: 'stop', words: `Not saved: ${save.message}` };
    case 'saving':
      return { tone: null, words: 'Saving…' };
    case 'saved':
      return unsaved > 0
        ? { tone: null, words: 'Saving…' }
        : { tone: null, words: `Saved ${describeTime(new Date(save.at), today, timeZone)}` };
  }
}
