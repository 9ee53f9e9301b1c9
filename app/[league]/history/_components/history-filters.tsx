'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { FilterChips } from '@/components/ui/filter-chips';
import { SearchInput } from '@/components/ui/search-input';
import { eventKinds, type EventKind } from '@/lib/domain/audit/event-kinds';
import { capitalise } from '@/lib/domain/text/sentence';
import { writeQuery } from './write-query';

const chips = [
  { id: 'all' as const, label: 'All' },
  ...eventKinds.map((id) => ({ id, label: capitalise(id) })),
];

/** Narrows the history; what is chosen stands in the address, so that it can be kept and sent on. */
export function HistoryFilters({
  kind,
  search,
  here,
}: {
  kind: EventKind | null;
  search: string;
  here: string;
}) {
  const router = useRouter();
  const [pending, startTransition] = useTransition();
  const [words, setWords] = useState(search);
  // The way back in the browser changes the address, and what is typed here follows it.
  const [seen, setSeen] = useState(search);
  if (seen !== search) {
    setSeen(search);
    setWords(search);
  }
  const show = (nextKind: EventKind | null, nextWords: string) =>
    startTransition(() =>
      router.push(`${here}${writeQuery({ kind: nextKind, search: nextWords.trim(), before: null })}`),
    );
  const send = (event: FormEvent) => {
    event.preventDefault();
    show(kind, words);
  };
  return (
    <div className="flex flex-wrap items-center justify-between gap-3 px-4 py-3 print:hidden">
      <FilterChips
        label="Kinds of event"
        chips={chips}
        chosen={kind ?? 'all'}
        onChoose={(id) => show(id === 'all' ? null : id, words)}
      />
      <form role="search" onSubmit={send} className="flex min-w-0 gap-2 max-sm:w-full">
        <SearchInput
          label="Find a name or word"
          value={words}
          maxLength={100}
          onChange={(event) => setWords(event.target.value)}
        />
        <Button type="submit" pending={pending}>
          Find
        </Button>
      </form>
    </div>
  );
}
