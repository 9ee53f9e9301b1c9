import { colourDifference } from '../colour/colour-difference';
import { contrastRatio, writeRatio } from '../colour/contrast-ratio';
import { type Kit, type KitKind, type TeamKits } from './kit';
import { capitalise } from '../text/sentence';

/** Below this CIEDE2000 difference two bodies clash, below the other they are close. Common practice, no source. */
export const clashBelow = 20;
export const closeBelow = 30;

export type KitVerdict = 'clear' | 'close' | 'clash';
export type KitComparison = { deltaE: number; verdict: KitVerdict; says: string };

const judgeDifference = (deltaE: number): KitVerdict =>
  deltaE < clashBelow ? 'clash' : deltaE < closeBelow ? 'close' : 'clear';

const verdictSentence: Record<KitVerdict, (a: string, b: string) => string> = {
  clash: (a, b) => `${a} and ${b} are too alike to tell the teams apart.`,
  close: (a, b) => `${a} and ${b} are close: look at both shirts in the light of the pitch or hall.`,
  clear: (a, b) => `${a} and ${b} are easy to tell apart.`,
};

/**
 * How well two kits can be told apart by their bodies (CIEDE2000 difference, not rounded): `clash` below 20, `close`
 * below 30, else `clear`; both limits are common practice, no source. Sleeves do not change the verdict; the sentence
 * says when they are so unlike their bodies that they could confuse. An estimate: cloth and light differ from a screen.
 */
export function compareKits(a: Kit, b: Kit): KitComparison {
  const deltaE = colourDifference(a.body, b.body);
  const verdict = judgeDifference(deltaE);
  const says = verdictSentence[verdict](capitalise(a.name), b.name);
  const sleeves = verdict === 'clash' ? '' : noteSleeves(a, b);
  return { deltaE, verdict, says: `${says}${sleeves}` };
}

/** A warning when the sleeves of one kit look like the body of the other, or both sleeves look the same. */
function noteSleeves(a: Kit, b: Kit): string {
  if (colourDifference(a.sleeves, b.body) < clashBelow)
    return ` The sleeves of ${a.name} look like ${b.name}.`;
  if (colourDifference(b.sleeves, a.body) < clashBelow)
    return ` The sleeves of ${b.name} look like ${a.name}.`;
  return colourDifference(a.sleeves, b.sleeves) < clashBelow ? ' Their sleeves look alike.' : '';
}

export type NumberContrast = { ratio: number; verdict: 'clear' | 'thin' | 'poor'; says: string };

/** Contrast ratios of W3C, WCAG 2.2: 4.5 for text (SC 1.4.3), 3 for large text and graphics (SC 1.4.3, 1.4.11). */
const clearFrom = 4.5;
const thinFrom = 3;

/**
 * How well the number stands out from the body: contrast ratio (1 to 21, not rounded before it is compared), `clear`
 * from 4.5, `thin` from 3, else `poor`. The limits are screen limits of W3C, WCAG 2.2, SC 1.4.3 and 1.4.11; that cloth
 * should meet them is the program's choice, no rule book's. An outline does not count.
 */
export function numberContrast(kit: Kit): NumberContrast {
  const ratio = contrastRatio(kit.number, kit.body);
  const verdict = ratio >= clearFrom ? 'clear' : ratio >= thinFrom ? 'thin' : 'poor';
  const effect = {
    clear: 'stands out well',
    thin: 'stands out only just: look at it from a distance',
    poor: 'is hard to read',
  }[verdict];
  return { ratio, verdict, says: `The number on ${kit.name} ${effect} (${writeRatio(ratio)}).` };
}

/**
 * One way to dress the two teams. `changes` names who leaves the kit they bring to such a match: the home team its home
 * kit, the away team its away kit (its home kit when it owns no other).
 */
export type KitPairing = {
  home: KitKind;
  away: KitKind;
  homeKit: Kit;
  awayKit: Kit;
  changes: 'nobody' | 'home' | 'away' | 'both';
  comparison: KitComparison;
};

export type KitChoice = { pairings: KitPairing[]; chosen: KitPairing | null; says: string };

/**
 * Every way to dress two teams, in the order they are tried, and the first that is clear: the home team in its home
 * kit against the away kit, then the home kit, of the away team; only then the home team in its away kit. `chosen` is
 * null when none is clear, and the sentence then names the best of them. Who has to change differs by competition.
 */
export function chooseKits(homeTeam: TeamKits, awayTeam: TeamKits): KitChoice {
  const pairings = listPairings(homeTeam, awayTeam);
  const chosen = pairings.find((pairing) => pairing.comparison.verdict === 'clear') ?? null;
  return { pairings, chosen, says: chosen === null ? sayNoneClear(pairings) : sayChosen(chosen) };
}

function listPairings(homeTeam: TeamKits, awayTeam: TeamKits): KitPairing[] {
  return (['home', 'away'] as const).flatMap((home) =>
    (['away', 'home'] as const).flatMap((away) => {
      const homeKit = homeTeam[home];
      const awayKit = awayTeam[away];
      if (homeKit === null || awayKit === null) return [];
      const changes = nameChanges(home !== 'home', away !== 'away' && awayTeam.away !== null);
      return [{ home, away, homeKit, awayKit, changes, comparison: compareKits(homeKit, awayKit) }];
    }),
  );
}

function nameChanges(home: boolean, away: boolean): KitPairing['changes'] {
  if (home) return away ? 'both' : 'home';
  return away ? 'away' : 'nobody';
}

function sayChosen({ homeKit, awayKit, changes }: KitPairing): string {
  const wear = `the home team wears ${homeKit.name}, the away team ${awayKit.name}`;
  switch (changes) {
    case 'nobody':
      return `Nobody changes: ${wear}.`;
    case 'away':
      return `The away team changes to its home kit: ${wear}.`;
    case 'home':
      return `The home team changes to its away kit: ${wear}.`;
    case 'both':
      return `Both teams change: ${wear}.`;
  }
}

function sayNoneClear(pairings: readonly KitPairing[]): string {
  const [first, ...rest] = pairings;
  if (first === undefined) return 'There are no kits to compare.';
  const best = rest.reduce((a, b) => (b.comparison.deltaE > a.comparison.deltaE ? b : a), first);
  return `No two kits of these teams are clearly different. The least alike are ${best.homeKit.name} for the home team and ${best.awayKit.name} for the away team; bring bibs.`;
}
