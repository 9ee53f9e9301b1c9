'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import type { MatchCheck } from '@/lib/use-cases/match/check-match';

type Choice = MatchCheck['choice'];
type Picked = { division: string | null; home: string | null; away: string | null };

/** Picks the division and the two teams; each choice is an address of its own, so a match can be kept as a link. */
export function MatchChoice({ choice, path }: { choice: Choice; path: string }) {
  const router = useRouter();
  const [pending, startTransition] = useTransition();
  // Kept here as well as in the address: a second choice made before the first has been answered must not lose it.
  const [picked, setPicked] = useState<Picked>(choice);
  const answered = `${choice.division}/${choice.home}/${choice.away}`;
  const [seen, setSeen] = useState(answered);
  if (answered !== seen && !pending) {
    setSeen(answered);
    setPicked(choice);
  }
  const go = ({ division, home, away }: Picked) => {
    setPicked({ division, home, away });
    const query = new URLSearchParams();
    for (const [key, value] of Object.entries({ division, home, away })) if (value) query.set(key, value);
    startTransition(() => router.replace(`${path}?${query}`, { scroll: false }));
  };
  const options = (taken: string | null) =>
    choice.teams.map((team) => ({ value: team.slug, label: team.name, disabled: team.slug === taken }));

  return (
    <Card className="mb-4">
      <form className="grid gap-3 sm:grid-cols-3" aria-busy={pending}>
        <Field label="Division">
          {(wiring) => (
            <Select
              {...wiring}
              value={picked.division ?? ''}
              options={choice.divisions.map((division) => ({ value: division.slug, label: division.name }))}
              onChange={(event) => go({ division: event.target.value, home: null, away: null })}
            />
          )}
        </Field>
        <Field label="Home">
          {(wiring) => (
            <Select
              {...wiring}
              placeholder="Pick a team"
              value={picked.home ?? ''}
              options={options(picked.away)}
              onChange={(event) => go({ ...picked, home: event.target.value })}
            />
          )}
        </Field>
        <Field label="Away">
          {(wiring) => (
            <Select
              {...wiring}
              placeholder="Pick a team"
              value={picked.away ?? ''}
              options={options(picked.home)}
              onChange={(event) => go({ ...picked, away: event.target.value })}
            />
          )}
        </Field>
      </form>
      {picked.home !== null && picked.away !== null ? (
        <div className="mt-3">
          <Button size="sm" onClick={() => go({ ...picked, home: picked.away, away: picked.home })}>
            Swap home and away
          </Button>
        </div>
      ) : (
        <p className="text-dusk mt-3">
          {choice.teams.length < 2
            ? 'This division has fewer than two teams.'
            : 'Pick both teams to see their numbers and kits.'}
        </p>
      )}
    </Card>
  );
}
