import type { ReactNode } from 'react';
import { Card } from '@/components/ui/card';

/** One step of the job: its number as it would be worn, what happens, and a picture made of the product's own parts. */
export function StepCard({
  step,
  title,
  children,
  picture,
}: {
  step: number;
  title: string;
  children: ReactNode;
  picture: ReactNode;
}) {
  return (
    <Card className="flex flex-col">
      <div className="flex items-start gap-3">
        <span aria-hidden="true" className="type-jersey text-damson text-[2rem]">
          {step}
        </span>
        <div>
          <h3 className="type-section">{title}</h3>
          <p className="text-dusk mt-1">{children}</p>
        </div>
      </div>
      <div className="border-thread mt-4 border-t-[1.5px] border-dashed pt-4">{picture}</div>
    </Card>
  );
}
