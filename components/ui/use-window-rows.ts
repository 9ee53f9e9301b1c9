'use client';

import { useWindowVirtualizer } from '@tanstack/react-virtual';
import { useEffect, useRef, useState, useSyncExternalStore, type RefObject } from 'react';

/** From this many rows on, only those in sight are drawn. */
const windowedFrom = 101;
/** Height of a row of one line, in px, until it has been measured. */
const usualHeight = 49;
/** What the server draws of a long list, before the window's height is known. */
const firstRows = 40;

/**
 * Chooses which rows of a table body to draw: all of a short list, those near the window of a long one, and all of
 * them on paper. Gives the indexes, the heights of what is left out before and after, a ref that measures a row, and
 * `focusRow`, which brings a row into sight and focuses it.
 */
export function useWindowRows(count: number, body: RefObject<HTMLElement | null>) {
  const printing = useSyncExternalStore(watchPrinting, readPrinting, () => false);
  const mounted = useSyncExternalStore(watchNothing, yes, no);
  const [margin, setMargin] = useState(0);
  const on = count >= windowedFrom && !printing;

  const virtual = useWindowVirtualizer({
    count,
    enabled: on && mounted,
    estimateSize: () => usualHeight,
    // A table that is not on screen measures nothing, and then every row would seem to fit.
    measureElement: (element) => element.getBoundingClientRect().height || usualHeight,
    overscan: 12,
    scrollMargin: margin,
  });

  // What stands above the table may grow or shrink, so the place of its body is measured whenever the page does.
  useEffect(() => {
    if (!on) return;
    const observer = new ResizeObserver(() => {
      if (body.current !== null) setMargin(body.current.getBoundingClientRect().top + window.scrollY);
    });
    observer.observe(document.body);
    return () => observer.disconnect();
  }, [on, body]);

  const wanted = useRef<number | null>(null);
  const focusWanted = () => {
    const row = body.current?.querySelector<HTMLElement>(`tr[data-index="${wanted.current}"]`);
    if (row == null) return;
    wanted.current = null;
    row.focus();
  };
  // A row far away is drawn only after the window has moved, so the focus waits for it.
  useEffect(() => {
    if (wanted.current !== null) focusWanted();
  });
  const focusRow = (index: number) => {
    wanted.current = index;
    if (on) virtual.scrollToIndex(index, { align: 'auto' });
    focusWanted();
  };

  if (!on || !mounted) {
    const length = on ? firstRows : count;
    return { on, before: 0, after: 0, indexes: range(length), measure: null, focusRow };
  }
  const items = virtual.getVirtualItems();
  const first = items[0];
  const last = items.at(-1);
  return {
    on,
    before: first === undefined ? 0 : first.start - margin,
    after: last === undefined ? 0 : virtual.getTotalSize() - (last.end - margin),
    indexes: items.map((item) => item.index),
    measure: virtual.measureElement,
    focusRow,
  };
}

const range = (length: number) => Array.from({ length }, (_, index) => index);

const watchNothing = () => () => {};
const yes = () => true;
const no = () => false;

let paper = false;
const readPrinting = () => paper;
function watchPrinting(changed: () => void) {
  const set = (value: boolean) => () => {
    paper = value;
    changed();
  };
  const before = set(true);
  const after = set(false);
  window.addEventListener('beforeprint', before);
  window.addEventListener('afterprint', after);
  return () => {
    window.removeEventListener('beforeprint', before);
    window.removeEventListener('afterprint', after);
  };
}
