'use client';

import { useState } from 'react';
import { Checkbox } from '@/components/ui/checkbox';
import { FieldError } from '@/components/ui/field';
import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';
import { SearchInput } from '@/components/ui/search-input';

export type TeamChoice = { id: string; name: string; division: string; season: string };

/** Teams by division, with a search once there are many. Props: `teams`, `chosen` ids, `onChange`, `error`. */
export function TeamPicker({
  teams,
  chosen,
  onChange,
  error,
}: {
  teams: readonly TeamChoice[];
  chosen: ReadonlySet<string>;
  onChange: (chosen: Set<string>) => void;
  error?: string | undefined;
}) {
  const [search, setSearch] = useState('');
  const shown = teams.filter((team) =>
    holdsEveryWord(foldForSearch(`${team.name} ${team.division} ${team.season}`), search),
  );
  const groups = [...new Set(shown.map((team) => `${team.season}, ${team.division}`))];
  const toggle = (id: string, on: boolean) => {
    const next = new Set(chosen);
    if (on) next.add(id);
    else next.delete(id);
    onChange(next);
  };

  return (
    <fieldset>
      <legend className="type-label">Teams ({chosen.size} chosen)</legend>
      {teams.length > 10 && (
        <SearchInput
          label="Find a team"
          className="mt-2 sm:w-full"
          value={search}
          onChange={(event) => setSearch(event.target.value)}
        />
      )}
      <div
        tabIndex={0}
        role="group"
        aria-label="The teams to choose from"
        className="border-hem rounded-control mt-2 max-h-60 overflow-y-auto border px-3 py-1"
      >
        {groups.map((group) => (
          <div key={group} className="py-1.5">
            <p className="type-fine text-dusk pt-1 font-[560]">{group}</p>
            <div className="grid sm:grid-cols-2">
              {shown
                .filter((team) => `${team.season}, ${team.division}` === group)
                .map((team) => (
                  <Checkbox
                    key={team.id}
                    label={team.name}
                    checked={chosen.has(team.id)}
                    onChange={(event) => toggle(team.id, event.target.checked)}
                  />
                ))}
            </div>
          </div>
        ))}
        {shown.length === 0 && (
          <p className="text-dusk py-3">
            {teams.length === 0
              ? 'This league has no teams yet. Add them first.'
              : `No team fits “${search}”.`}
          </p>
        )}
      </div>
      {error !== undefined && (
        <div className="mt-1.5">
          <FieldError>{error}</FieldError>
        </div>
      )}
    </fieldset>
  );
}
