import type { Kit } from '@/lib/domain/kit/kit';
import type { Garment } from '@/lib/domain/roster/player';

/** What a demo team is there to show. */
export type DemoStory =
  | 'no roster'
  | 'collecting'
  | 'sizes missing'
  | 'two share a number'
  | 'digit above five'
  | 'name too long'
  | 'too few players'
  | 'zero and double zero'
  | 'cautions'
  | 'returned'
  | 'submitted'
  | 'signed off'
  | 'in the held batch'
  | 'batch on press'
  | 'batch received';

export type DemoTeam = { name: string; home: Kit; away: Kit | null; story: DemoStory; players: number };

export type DemoDivision = {
  name: string;
  ageBand: string;
  level: string;
  least: number;
  most: number;
  /** The key of one of the league's rule sets. */
  ruleSet: string;
  garments: Garment[];
  teams: DemoTeam[];
};

export type DemoLeague = {
  slug: string;
  name: string;
  sport: string;
  timeZone: string;
  unit: 'in' | 'mm';
  paper: 'A4' | 'Letter';
  currency: string;
  shipTo: string;
  ruleSets: { key: string; name: string; preset: string }[];
  divisions: DemoDivision[];
};
