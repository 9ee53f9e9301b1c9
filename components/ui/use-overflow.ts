'use client';

import { useEffect, useState } from 'react';

/**
 * Whether the first child of a frame is wider than the frame; `ref` goes to the frame. Only then may it scroll sideways:
 * a scrolling frame would keep a sticky head to itself instead of to the page. Clip it until then, so that the page is
 * never widened in the moment between a resize and this answer.
 */
export function useOverflow(): { ref: (frame: HTMLElement | null) => void; overflows: boolean } {
  const [frame, setFrame] = useState<HTMLElement | null>(null);
  const [overflows, setOverflows] = useState(false);
  useEffect(() => {
    const content = frame?.firstElementChild ?? null;
    if (frame === null || content === null) return;
    const measure = () => setOverflows(content.getBoundingClientRect().width > frame.clientWidth + 1);
    const observer = new ResizeObserver(measure);
    observer.observe(frame);
    observer.observe(content);
    measure();
    return () => observer.disconnect();
  }, [frame]);
  return { ref: setFrame, overflows };
}
