import type { LeagueValues } from '@/app/_components/league-fields';
import type { SeasonDays } from '@/lib/domain/dates/list-season-faults';

export type PresetChoice = {
  id: string;
  sport: string;
  title: string;
  summary: string;
  least: number;
  most: number;
};
export type KitChoice = { id: string; name: string; says: string };

/** What was typed so far, step by step; limits stay text until the server has read them. */
export type Draft = {
  league: LeagueValues;
  season: {
    name: string;
    sport: string;
    rosterOpensOn: string;
    freezesAt: string;
    /** Planned on the page of dates, once there is a season. */
    releaseOn: null;
    handOutOn: string;
    firstMatchOn: string;
  };
  division: {
    name: string;
    ageBand: string;
    leastPlayers: string;
    mostPlayers: string;
    starterKitId: string;
    presetId: string | null;
  };
  managers: string;
};

export const steps = ['league', 'season', 'division', 'managers'] as const;
export type Step = (typeof steps)[number];
export const stepTitles: Record<Step, string> = {
  league: 'The league',
  season: 'Its first season',
  division: 'Its first division',
  managers: 'Team managers',
};

/** An empty draft with what can be guessed. */
export const startDraft = (days: SeasonDays, kits: readonly KitChoice[]): Draft => ({
  league: { name: '', timeZone: '', unit: 'mm', paper: 'A4', currency: 'EUR' },
  season: {
    name: '',
    sport: '',
    rosterOpensOn: days.rosterOpensOn,
    freezesAt: `${days.freezeOn}T18:00`,
    releaseOn: null,
    handOutOn: days.handOutOn,
    firstMatchOn: days.firstMatchOn,
  },
  division: {
    name: '',
    ageBand: '',
    leastPlayers: '8',
    mostPlayers: '15',
    starterKitId: kits[0]?.id ?? '',
    presetId: null,
  },
  managers: '',
});

/** The first step that the server found something wrong in; undefined when none is to blame. */
export const findStepOf = (fields: Record<string, string>): Step | undefined =>
  steps.find((step) => Object.keys(fields).some((path) => path === step || path.startsWith(`${step}.`)));

/** The faults of one step by the names of its inputs. */
export const pickFaults = (fields: Record<string, string>, step: Step): Record<string, string> =>
  Object.fromEntries(
    Object.entries(fields).flatMap(([path, says]) =>
      path.startsWith(`${step}.`) ? [[path.slice(step.length + 1), says]] : [],
    ),
  );
