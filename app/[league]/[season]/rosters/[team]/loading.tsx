import { Card } from '@/components/ui/card';
import { Loading, Skeleton } from '@/components/ui/skeleton';

/** In the shape of the page, so that nothing jumps when the roster arrives. */
export default function RosterLoading() {
  return (
    <Loading label="The roster is on its way">
      <div className="mt-9 mb-5 flex items-center gap-4">
        <Skeleton className="h-14 w-15.5" />
        <div className="grid gap-2">
          <Skeleton className="h-7 w-40" />
          <Skeleton className="h-4 w-80 max-w-full" />
        </div>
      </div>
      <div className="grid items-start gap-4.5 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <Card flush>
          <div className="px-4 py-4">
            <Skeleton className="h-5 w-2/3" />
          </div>
          {Array.from({ length: 11 }, (_, at) => (
            <div
              key={at}
              className="border-hem grid h-[2.625rem] grid-cols-[9rem_7rem_3rem_1fr] items-center gap-3 border-t px-3"
            >
              <Skeleton className="h-4 w-full" />
              <Skeleton className="h-4 w-4/5" />
              <Skeleton className="h-5 w-7 justify-self-end" />
              <Skeleton className="h-4 w-20" />
            </div>
          ))}
        </Card>
        <Card title="Number rail">
          <Skeleton className="h-56 w-full" />
        </Card>
      </div>
    </Loading>
  );
}
