import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';

/** What a status means, whatever it is about: blocked, look at it, for your information, done, not yet. */
export type Tone = 'stop' | 'care' | 'note' | 'set' | 'wait';

/** Text colour of each tone on a page, a card or its own wash. */
export const toneText: Record<Tone, string> = {
  stop: 'text-stop',
  care: 'text-care',
  note: 'text-note',
  set: 'text-set',
  wait: 'text-dusk',
};

/** Ground of each tone. */
export const toneWash: Record<Tone, string> = {
  stop: 'bg-stop-wash',
  care: 'bg-care-wash',
  note: 'bg-note-wash',
  set: 'bg-set-wash',
  wait: 'bg-linen',
};

/**
 * The shape of a status: octagon with a bar (stop), triangle (care), disc with an i (note), tick (set), dashed ring
 * (wait). Props: `tone`, `size` in px (14 unless given), `label` when no word stands beside it.
 */
export function StatusMark({
  tone,
  size = 14,
  label,
  className,
}: {
  tone: Tone;
  size?: number;
  label?: string | undefined;
  className?: string | undefined;
}) {
  const name = label === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label };
  return (
    <svg
      {...name}
      focusable="false"
      width={size}
      height={size}
      viewBox="0 0 16 16"
      className={joinClasses('shrink-0', toneText[tone], className)}
    >
      {shapes[tone]}
    </svg>
  );
}

const knockedOut = 'var(--card)';

const shapes: Record<Tone, ReactNode> = {
  stop: (
    <>
      <path fill="currentColor" d="M5.1 1h5.8L15 5.1v5.8L10.9 15H5.1L1 10.9V5.1z" />
      <path fill={knockedOut} d="M4.5 6.9h7v2.2h-7z" />
    </>
  ),
  care: (
    <>
      <path
        fill="currentColor"
        d="M8 1.2c.5 0 .9.2 1.1.7l6 11.2c.5.9-.1 1.9-1.1 1.9H2c-1 0-1.6-1-1.1-1.9l6-11.2c.2-.5.6-.7 1.1-.7z"
      />
      <path fill={knockedOut} d="M7.1 5.6h1.8l-.2 4.5H7.3zM8 11a1 1 0 1 1 0 2 1 1 0 0 1 0-2z" />
    </>
  ),
  note: (
    <>
      <circle fill="currentColor" cx="8" cy="8" r="7" />
      <path fill={knockedOut} d="M7.1 7h1.8v5H7.1zM8 3.7a1.1 1.1 0 1 1 0 2.2 1.1 1.1 0 0 1 0-2.2z" />
    </>
  ),
  set: (
    <path
      fill="none"
      stroke="currentColor"
      strokeWidth="2.6"
      strokeLinecap="square"
      strokeLinejoin="miter"
      d="M3.2 8.6l3 3L12.9 4.6"
    />
  ),
  wait: (
    <circle
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      strokeDasharray="2.7 2.011"
      cx="8"
      cy="8"
      r="6"
    />
  ),
};
