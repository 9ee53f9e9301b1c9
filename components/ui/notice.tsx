import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';
import { StatusMark, toneText, toneWash, type Tone } from './status-mark';

/**
 * A sentence or two that belongs to the page, with its shape and colour. Props: `tone`, `title`, children, `action`,
 * `live` when it appears after the page did ("polite", or "assertive" for what blocks), `flush` inside a card.
 */
export function Notice({
  tone,
  title,
  action,
  live,
  flush = false,
  children,
}: {
  tone: Tone;
  title?: ReactNode;
  action?: ReactNode;
  live?: 'polite' | 'assertive' | undefined;
  flush?: boolean | undefined;
  children?: ReactNode;
}) {
  return (
    <div
      role={live === 'assertive' ? 'alert' : live === 'polite' ? 'status' : undefined}
      className={joinClasses(
        'true-colour flex items-start gap-2.5 px-4 py-3',
        toneWash[tone],
        flush ? 'border-hem border-t' : 'rounded-control',
      )}
    >
      <StatusMark tone={tone} size={16} className="mt-0.5" />
      <div className="min-w-0 grow">
        {title !== undefined && <p className={joinClasses('font-[600]', toneText[tone])}>{title}</p>}
        {children !== undefined && <div className="text-ink">{children}</div>}
      </div>
      {action !== undefined && <div className="shrink-0">{action}</div>}
    </div>
  );
}
