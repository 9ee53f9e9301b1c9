import { Card } from '@/components/ui/card';
import { Loading, Skeleton } from '@/components/ui/skeleton';

export default function LeagueLoading() {
  return (
    <Loading label="The page is on its way">
      <div className="mb-5 grid gap-2">
        <Skeleton className="h-7 w-56" />
        <Skeleton className="h-4 w-80 max-w-full" />
      </div>
      <Card>
        <div className="grid gap-4">
          {['w-3/4', 'w-full', 'w-5/6', 'w-full', 'w-2/3', 'w-full'].map((width, at) => (
            <Skeleton key={at} className={`h-5 ${width}`} />
          ))}
        </div>
      </Card>
    </Loading>
  );
}
