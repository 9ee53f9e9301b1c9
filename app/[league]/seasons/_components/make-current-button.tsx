'use client';

import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { useToast } from '@/components/ui/toast';
import { useSubmit } from '@/app/_components/use-submit';
import type { LeagueAction } from '@/lib/web/action-result';

/** Makes a season the one that people land in; choosing another takes it back. */
export function MakeCurrentButton({
  league,
  season,
  onChoose,
}: {
  league: string;
  season: { id: string; name: string };
  onChoose: LeagueAction<{ seasonId: string }, { name: string }>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const { submit, pending, failure } = useSubmit(onChoose, ({ name }) => {
    showToast({ tone: 'set', title: `${name} is the current season` });
    router.refresh();
  });
  return (
    <>
      <Button size="sm" pending={pending} onClick={() => void submit(league, { seasonId: season.id })}>
        Make current
      </Button>
      {failure && <p className="text-stop type-small">{failure.message}</p>}
    </>
  );
}
