import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';

/** A quiet bar where something will stand. Give it the size of what comes with `className` (h-4 w-32). */
export function Skeleton({ className = 'h-4 w-full' }: { className?: string }) {
  return (
    <span
      aria-hidden="true"
      className={joinClasses('animate-breathe bg-linen border-hem block rounded border', className)}
    />
  );
}

/** Wraps skeletons of a page or a card and says once that it is loading. Props: `label`, children. */
export function Loading({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div role="status" aria-busy="true">
      <span className="sr-only">{label}</span>
      {children}
    </div>
  );
}
