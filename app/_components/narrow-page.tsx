import type { ReactNode } from 'react';
import { Card } from '@/components/ui/card';

/** A page with one form: title, a sentence, a card. Props: `title`, `lead`, `children` (in the card), `after` below it. */
export function NarrowPage({
  title,
  lead,
  children,
  after,
}: {
  title: string;
  lead?: ReactNode;
  children?: ReactNode;
  after?: ReactNode;
}) {
  return (
    <div className="mx-auto grid max-w-105 gap-5 sm:pt-6">
      <header>
        <h1 className="type-page">{title}</h1>
        {lead !== undefined && <p className="text-dusk mt-1.5">{lead}</p>}
      </header>
      {children !== undefined && <Card>{children}</Card>}
      {after}
    </div>
  );
}
