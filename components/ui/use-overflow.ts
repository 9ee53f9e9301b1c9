'use client';

import { useEffect, useState, type RefObject } from 'react';

/**
 * Whether the first child of the frame is wider than the frame. Only then may it scroll sideways: a scrolling frame
 * would keep a sticky head to itself instead of to the page. Clip it until then, so that the page is never widened in
 * the moment between a resize and this answer.
 */
export function useOverflow(frame: RefObject<HTMLElement | null>): boolean {
  const [overflows, setOverflows] = useState(false);
  useEffect(() => {
    const element = frame.current;
    const content = element?.firstElementChild ?? null;
    if (element === null || content === null) return;
    const measure = () => setOverflows(content.getBoundingClientRect().width > element.clientWidth + 1);
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    observer.observe(content);
    measure();
    return () => observer.disconnect();
  }, [frame]);
  return overflows;
}
