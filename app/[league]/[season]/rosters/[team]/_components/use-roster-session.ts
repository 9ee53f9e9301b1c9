'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect, useState, useSyncExternalStore } from 'react';
import type { RosterPage } from '@/lib/use-cases/rosters/get-roster';
import { KeptWorkStore } from './kept-work';
import { makeId } from './make-id';
import { RosterSession } from './roster-session';

const pollMs = 5_000;
const markMs = 60_000;

/** Opens a roster in this tab: what is seen, how the saving stands, and the session to change it through. */
export function useRosterSession(
  url: string,
  roster: RosterPage,
  user: { id: string; name: string },
  editable: boolean,
) {
  const router = useRouter();
  const toFacts = (page: RosterPage) => ({
    revision: page.revision,
    state: page.state,
    players: page.players,
    savedAt: page.updated.at.getTime(),
  });
  const [session] = useState(
    () =>
      new RosterSession({
        url,
        roster: toFacts(roster),
        editable,
        store: new KeptWorkStore(findStorage(), findLocks(), {
          userId: user.id,
          rosterId: roster.id,
          tabId: makeId(),
        }),
        me: user.name,
        onStale: () => router.refresh(),
        fetch: (...args) => fetch(...args),
        now: () => Date.now(),
      }),
  );
  const snapshot = useSyncExternalStore(session.subscribe, session.getSnapshot, session.getSnapshot);

  useEffect(() => session.start(), [session]);
  useEffect(() => session.receivePage(toFacts(roster), editable), [session, roster, editable]);

  useEffect(() => {
    // The session or the connection may be back; and what is typed must be on its way before the tab sleeps.
    const back = () => session.retry();
    const hide = () => {
      if (document.visibilityState === 'hidden') void session.flush();
      else back();
    };
    window.addEventListener('online', back);
    window.addEventListener('focus', back);
    document.addEventListener('visibilitychange', hide);
    const timer = setInterval(() => session.dropMarks(Date.now() - markMs), 10_000);
    return () => {
      window.removeEventListener('online', back);
      window.removeEventListener('focus', back);
      document.removeEventListener('visibilitychange', hide);
      clearInterval(timer);
    };
  }, [session]);

  useQuery({
    queryKey: ['roster', roster.id],
    queryFn: ({ signal }) => session.poll(signal),
    refetchInterval: pollMs,
    refetchOnWindowFocus: 'always',
    retry: false,
    staleTime: 0,
  });

  return { session, ...snapshot };
}

/** Storage may be forbidden by the browser's settings; then nothing is kept, and saving goes on. */
function findStorage(): Storage | undefined {
  try {
    return typeof window === 'undefined' ? undefined : window.localStorage;
  } catch {
    return undefined;
  }
}

const findLocks = (): LockManager | undefined =>
  typeof navigator === 'undefined' || !('locks' in navigator) ? undefined : navigator.locks;
