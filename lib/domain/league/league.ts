import type { LeagueActor } from '../access/permissions';

/** What every page of a league needs to know of it. Times are shown in `timeZone`, lengths in `unit`. */
export type LeagueSummary = {
  id: string;
  slug: string;
  name: string;
  timeZone: string;
  unit: 'in' | 'mm';
  paper: 'A4' | 'Letter';
  currency: string;
  /** The season people work in; null only until the first one is opened. */
  currentSeason: { id: string; slug: string; name: string } | null;
};

/** A person who is signed in, and what they are in each of their leagues. */
export type Person = {
  userId: string;
  email: string;
  name: string;
  leagues: { league: LeagueSummary; actor: LeagueActor }[];
};
