import type { RuleSet } from '../rules/rule-set';
import type { CellField } from './edit';
import type { Garment, RosterLine } from './player';

/** A column of a roster that holds a cell of each player. `garment` is there for sizes, `roles` for roles. */
export type RosterColumn = {
  field: CellField;
  header: string;
  garment?: Garment;
  roles?: readonly string[];
};

/** The roles a rule set knows of: those it asks for, and those that numbers are set aside for. Without repeats. */
export const listRoles = (rules: RuleSet | null): string[] => [
  ...new Set([
    ...(rules?.roster.requiredRoles.map(({ role }) => role) ?? []),
    ...(rules?.reserved.flatMap(({ roles }) => roles) ?? []),
  ]),
];

/**
 * The columns a roster is edited in. Names on the back and roles have one only where the rules, or somebody's entry,
 * give it something to hold; every garment of the kit has one.
 */
export function listRosterColumns(
  rules: RuleSet | null,
  garments: readonly Garment[],
  players: readonly RosterLine[],
): RosterColumn[] {
  const roles = listRoles(rules);
  const named = rules?.names.onBack !== 'not allowed' || players.some(({ nameOnBack }) => nameOnBack !== '');
  const withRoles = roles.length > 0 || players.some(({ role }) => role !== '');
  return [
    { field: 'name', header: 'Player' },
    ...(named ? [{ field: 'nameOnBack', header: 'Name on back' } as const] : []),
    { field: 'number', header: 'No.' },
    ...garments.map((garment): RosterColumn => ({
      field: `size:${garment.code}`,
      header: garment.name,
      garment,
    })),
    ...(withRoles ? [{ field: 'role', header: 'Role', roles } as const] : []),
  ];
}
