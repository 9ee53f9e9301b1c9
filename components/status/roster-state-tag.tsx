import { StatusTag } from '@/components/ui/tag';
import type { Tone } from '@/components/ui/status-mark';
import type { RosterState } from '@/lib/domain/roster/roster-state';

const tones: Record<RosterState, Tone> = {
  open: 'wait',
  submitted: 'note',
  returned: 'care',
  'signed off': 'set',
  frozen: 'set',
};

/** The state of a roster. Props: `state`, null when the team has no roster yet. */
export function RosterStateTag({ state }: { state: RosterState | null }) {
  return state === null ? (
    <StatusTag tone="stop">no roster</StatusTag>
  ) : (
    <StatusTag tone={tones[state]}>{state}</StatusTag>
  );
}
