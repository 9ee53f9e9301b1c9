'use client';

import { Toast as Radix } from 'radix-ui';
import { createContext, useCallback, useContext, useRef, useState, type ReactNode } from 'react';
import { Icon } from './icon';
import { StatusMark, type Tone } from './status-mark';

/** What a toast says. `action` such as Undo keeps it on screen longer. */
export type ToastMessage = {
  tone: Tone;
  title: string;
  body?: string | undefined;
  action?: { label: string; onSelect: () => void } | undefined;
};

type Shown = ToastMessage & { id: number };

const ShowToast = createContext<(message: ToastMessage) => void>(() => {});

/** Gives the function that shows a toast: `showToast({ tone: 'set', title: 'Saved 12 players', action })`. */
export const useToast = () => useContext(ShowToast);

/**
 * Where toasts appear, and the way for everything inside to show one. At most three stand at once; F8 moves the focus
 * there; they wait while the pointer or the focus is on them.
 */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<Shown[]>([]);
  const nextId = useRef(1);
  const show = useCallback((message: ToastMessage) => {
    const id = nextId.current++;
    setShown((all) => [...all, { ...message, id }].slice(-3));
  }, []);
  const drop = (id: number) => setShown((all) => all.filter((toast) => toast.id !== id));

  return (
    <ShowToast value={show}>
      <Radix.Provider swipeDirection="right" label="Message">
        {children}
        {shown.map((toast) => (
          <Toast key={toast.id} toast={toast} onGone={() => drop(toast.id)} />
        ))}
        <Radix.Viewport
          label="Messages ({hotkey})"
          className="fixed right-0 bottom-0 z-50 m-0 grid w-full max-w-104 list-none gap-2 p-4 max-sm:pb-20 print:hidden"
        />
      </Radix.Provider>
    </ShowToast>
  );
}

function Toast({ toast, onGone }: { toast: Shown; onGone: () => void }) {
  return (
    <Radix.Root
      type={toast.tone === 'stop' ? 'foreground' : 'background'}
      duration={toast.action !== undefined || toast.tone === 'stop' ? 12_000 : 6_000}
      onOpenChange={(open) => {
        if (!open) onGone();
      }}
      className="rounded-card border-ink bg-ink text-on-ink animate-rise flex items-center gap-2.5 border py-2 pr-2 pl-3.5"
    >
      <span className="bg-card grid size-6 shrink-0 place-items-center rounded-full">
        <StatusMark tone={toast.tone} size={13} />
      </span>
      <div className="min-w-0 grow">
        <Radix.Title className="font-[600]">{toast.title}</Radix.Title>
        {toast.body !== undefined && (
          <Radix.Description className="type-small">{toast.body}</Radix.Description>
        )}
      </div>
      {toast.action !== undefined && (
        <Radix.Action
          altText={toast.action.label}
          onClick={toast.action.onSelect}
          className="rounded-control touch outline-on-ink! shrink-0 px-3 font-[600] underline underline-offset-3"
        >
          {toast.action.label}
        </Radix.Action>
      )}
      <Radix.Close
        aria-label="Close"
        className="touch-square rounded-control outline-on-ink! inline-flex shrink-0 items-center justify-center"
      >
        <Icon name="close" />
      </Radix.Close>
    </Radix.Root>
  );
}
