'use client';

import { useEffect, useState, type RefObject } from 'react';

/**
 * Whether what is in the frame is wider than the frame. Only then may it scroll sideways: a scrolling frame would keep
 * a sticky head to itself instead of to the page.
 */
export function useOverflow(frame: RefObject<HTMLElement | null>): boolean {
  const [overflows, setOverflows] = useState(false);
  useEffect(() => {
    const element = frame.current;
    if (element === null) return;
    const measure = () => setOverflows(element.scrollWidth > element.clientWidth + 1);
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    if (element.firstElementChild !== null) observer.observe(element.firstElementChild);
    measure();
    return () => observer.disconnect();
  }, [frame]);
  return overflows;
}
