import { joinWords } from '@/lib/domain/text/sentence';

/** What a role is about: the manager's teams, the decorator's shop, or the whole league. */
export function describePlace(held: {
  role: string;
  teams: readonly { name: string }[];
  shop: { name: string } | null;
}): string {
  if (held.shop !== null) return held.shop.name;
  if (held.role === 'team manager')
    return held.teams.length === 0 ? 'No team' : joinWords(held.teams.map((team) => team.name));
  return 'The whole league';
}
