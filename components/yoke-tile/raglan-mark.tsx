import { body, garmentBox, leftSleeve, rightSleeve } from './garment-outlines';

/** The mark of the product: a raglan in ink with damson sleeves. Hidden from screen readers; the wordmark names it. */
export function RaglanMark({ className = 'w-7.5' }: { className?: string }) {
  return (
    <svg aria-hidden="true" focusable="false" viewBox={garmentBox} className={`h-auto shrink-0 ${className}`}>
      <path d={leftSleeve} className="fill-damson" />
      <path d={rightSleeve} className="fill-damson" />
      <path d={body} className="fill-ink stroke-linen" strokeWidth="2" />
    </svg>
  );
}

/** The mark and the name. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2.5">
      <RaglanMark />
      <span className="text-[1.25rem] leading-none font-[640] [font-stretch:112%]">Raglan</span>
    </span>
  );
}
