'use client';

import { Tooltip as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

/**
 * More about a figure or a sign, on hover and on focus: a length in the other unit, a date in full. Never the only
 * place of something a person must know, because a finger cannot hover. Props: `says`, children (focusable).
 */
export function Tooltip({ says, children }: { says: ReactNode; children: ReactNode }) {
  return (
    <Radix.Provider delayDuration={250}>
      <Radix.Root>
        <Radix.Trigger asChild>{children}</Radix.Trigger>
        <Radix.Portal>
          <Radix.Content
            sideOffset={6}
            collisionPadding={8}
            className="type-small rounded-control bg-ink text-on-ink animate-arrive z-50 max-w-72 px-2.5 py-1.5 print:hidden"
          >
            {says}
          </Radix.Content>
        </Radix.Portal>
      </Radix.Root>
    </Radix.Provider>
  );
}
