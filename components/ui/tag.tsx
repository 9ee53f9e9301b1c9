import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';
import { StatusMark, toneText, toneWash, type Tone } from './status-mark';

/** A status as shape, word and colour on its wash. Props: `tone`, the words as children. */
export function StatusTag({ tone, children }: { tone: Tone; children: ReactNode }) {
  return (
    <span
      className={joinClasses(
        'type-fine true-colour inline-flex min-h-6 items-center gap-1.5 rounded px-2 py-0.5 font-[600] whitespace-nowrap',
        toneText[tone],
        toneWash[tone],
      )}
    >
      <StatusMark tone={tone} size={13} />
      {children}
    </span>
  );
}

/** The same without a ground, for table cells: shape and a figure or a word. */
export function StatusText({ tone, children }: { tone: Tone; children: ReactNode }) {
  return (
    <span className={joinClasses('inline-flex items-center gap-1.5 font-[560]', toneText[tone])}>
      <StatusMark tone={tone} size={14} />
      {children}
    </span>
  );
}

/** A plain label for things that are not a status, such as a role or a kind of file. */
export function Tag({ children }: { children: ReactNode }) {
  return (
    <span className="type-fine border-hem bg-card text-dusk inline-flex min-h-6 items-center rounded border px-2 py-0.5 max-w-full font-[560] break-words">
      {children}
    </span>
  );
}
