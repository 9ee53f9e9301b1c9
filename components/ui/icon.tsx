import type { ReactNode } from 'react';

/**
 * A line drawing beside words or in an icon button. `name` picks it, `size` is in px (16 unless given). Always
 * hidden from screen readers: the words beside it, or the button's label, say what it means.
 */
export function Icon({ name, size = 16, className }: { name: IconName; size?: number; className?: string }) {
  return (
    <svg
      aria-hidden="true"
      focusable="false"
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
      strokeLinecap="round"
      strokeLinejoin="round"
      className={className === undefined ? 'shrink-0' : `shrink-0 ${className}`}
    >
      {drawings[name]}
    </svg>
  );
}

const drawings = {
  add: <path d="M8 3v10M3 8h10" />,
  close: <path d="M4 4l8 8M12 4l-8 8" />,
  tick: <path d="M3 8.5l3.5 3.5L13 4.5" />,
  more: (
    <g fill="currentColor" stroke="none">
      <circle cx="3" cy="8" r="1.4" />
      <circle cx="8" cy="8" r="1.4" />
      <circle cx="13" cy="8" r="1.4" />
    </g>
  ),
  search: (
    <>
      <circle cx="7" cy="7" r="4.2" />
      <path d="M10.2 10.2L13.5 13.5" />
    </>
  ),
  down: <path d="M4 6l4 4 4-4" />,
  up: <path d="M4 10l4-4 4 4" />,
  left: <path d="M10 4L6 8l4 4" />,
  right: <path d="M6 4l4 4-4 4" />,
  back: <path d="M13 8H3M7 4L3 8l4 4" />,
  forward: <path d="M3 8h10M9 4l4 4-4 4" />,
  menu: <path d="M2.5 4.5h11M2.5 8h11M2.5 11.5h11" />,
  download: <path d="M8 2.5v7.5M4.5 7L8 10.5 11.5 7M3 13.5h10" />,
  upload: <path d="M8 10.5V3M4.5 6L8 2.5 11.5 6M3 13.5h10" />,
  copy: (
    <>
      <rect x="5.5" y="5.5" width="8" height="8" rx="1.5" />
      <path d="M3.5 10.5h-.5a.5.5 0 0 1-.5-.5V3a.5.5 0 0 1 .5-.5h7a.5.5 0 0 1 .5.5v.5" />
    </>
  ),
  undo: <path d="M5.5 3L2.5 6l3 3M2.5 6h7a3.5 3.5 0 0 1 0 7H6" />,
  redo: <path d="M10.5 3l3 3-3 3M13.5 6h-7a3.5 3.5 0 0 0 0 7H10" />,
  edit: <path d="M3 13l.6-2.8L10.5 3.3l2.2 2.2-6.9 6.9zM9 4.8L11.2 7" />,
  bin: <path d="M3 4.5h10M6 4.5V3h4v1.5M4.5 4.5l.5 8.5h6l.5-8.5" />,
  file: <path d="M4 2.5h5L12 5.5v8H4zM9 2.5v3h3" />,
  print: <path d="M4.5 6V2.5h7V6M4.5 11h-2V6h11v5h-2M4.5 9.5h7v4h-7z" />,
  mail: <path d="M2.5 4h11v8h-11zM2.5 4.5L8 8.5l5.5-4" />,
  person: <path d="M8 8a2.5 2.5 0 1 0 0-5 2.5 2.5 0 0 0 0 5zM3 13.5c.5-2.5 2.5-3.5 5-3.5s4.5 1 5 3.5" />,
  leave: <path d="M6.5 2.5h-4v11h4M6.5 8h7M10.5 5l3 3-3 3" />,
  swap: <path d="M2.5 5.5h9M9 3l2.5 2.5L9 8M13.5 10.5h-9M7 8l-2.5 2.5L7 13" />,
} satisfies Record<string, ReactNode>;

export type IconName = keyof typeof drawings;
