import { joinClasses } from './join-classes';

/** A dashed line that divides two parts of one thing. */
export function Seam({ className }: { className?: string }) {
  return <hr className={joinClasses('border-thread border-0 border-t-[1.5px] border-dashed', className)} />;
}
