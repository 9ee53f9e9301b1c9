'use client';

import { useMemo } from 'react';
import { NumberRail } from '@/components/number-rail/number-rail';
import { Card } from '@/components/ui/card';
import { readNumber } from '@/lib/domain/numbers/label';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import type { RuleSet } from '@/lib/domain/rules/rule-set';

export const railId = 'number-rail';

/** The number rail of the roster: pick a player, then a number. Props: `player` picked, `onPick` null while read only. */
export function RailCard({
  rules,
  players,
  player,
  onPick,
  onVisit,
}: {
  rules: RuleSet;
  players: readonly RosterEntry[];
  player: RosterEntry | undefined;
  onPick: ((label: string) => void) | null;
  onVisit: (row: number) => void;
}) {
  const labels = useMemo(() => buildNumberRail(rules, players), [rules, players]);
  const reading = player && readNumber(player.number);
  const name = player && (player.name || 'the player without a name');
  return (
    <Card id={railId} title="Number rail" className="lg:sticky lg:top-5 print:hidden">
      <p className="type-small text-dusk -mt-2 mb-3">
        {onPick === null
          ? 'Who wears which number.'
          : name === undefined
            ? 'Pick a player, then a number.'
            : `A number for ${name}.`}
      </p>
      <NumberRail
        label={name === undefined || onPick === null ? 'Numbers' : `Numbers for ${name}`}
        labels={labels}
        chosen={reading?.ok === true ? reading.label : undefined}
        onPick={onPick !== null && player !== undefined ? onPick : undefined}
        onVisit={(rows) => {
          const [first] = rows;
          if (first !== undefined) onVisit(first);
        }}
      />
    </Card>
  );
}
