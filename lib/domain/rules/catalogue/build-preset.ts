import { joinWords } from '../../text/sentence';
import { type Citation, type RuleSet } from '../rule-set';
import {
  settledParts,
  type CataloguePreset,
  type PresetCitation,
  type SettledPart,
} from './catalogue-preset';

/** What the file of a sport states about a code; everything left out stays neutral and is named as open. */
export type PresetDraft = {
  id: string;
  sport: string;
  title: string;
  summary: string;
  inForce?: { from?: string; to?: string };
  labels: Pick<RuleSet['labels'], 'allowed'> & Partial<RuleSet['labels']>;
  reserved?: RuleSet['reserved'];
  roster?: Partial<RuleSet['roster']>;
  names?: Partial<RuleSet['names']>;
  citations: readonly PresetCitation[];
  /** What is open in this code: a sentence of its own for a part nothing settles, and doubts besides. */
  open?: Partial<Record<SettledPart, string>>;
  doubts?: readonly string[];
};

/** What everyone expects and no passage read for a code says: used where a code is silent on repeated numbers. */
const customOfUniqueness: PresetCitation = {
  body: 'No body',
  document: 'Common practice, no source',
  edition: '',
  rule: '',
  known: 'common practice',
  settles: ['repeated numbers'],
  says: 'Two players of one team do not wear the same number.',
};

const openSentences: Record<SettledPart, string> = {
  numbers: 'Which numbers may be worn is not in the passage known to us.',
  digits: 'Whether only some digits may be worn is not in the passage known to us: any digit is let in.',
  'number of digits': 'How many digits a number may have is not in the passage known to us: two are let in.',
  'leading zeros': 'Leading zeros, such as 07, are not in the passage known to us: they are refused.',
  '0 and 00': '0 and 00 are not in the passage known to us: the list of numbers decides.',
  'repeated numbers': 'Repeated numbers are not in the passage known to us: they are refused within a team.',
  'numbers set aside': 'Numbers set aside for a role are not in the passage known to us: none are.',
  'roster size':
    'The size of a roster is not in the passage known to us: set the least and the most yourself.',
  roles: 'Required roles are not in the passage known to us: none are asked for.',
  'names on the back':
    'Names on the back are not in the passage known to us: they are let in, not asked for.',
  'letters of names':
    'The letters and length of names are not in the passage known to us: any letters, at most 40.',
};

/**
 * Fills a draft up to a whole preset with neutral values: no roster limits, names let in and not asked for, any
 * letters. How much each rule weighs is the league's choice; presets start with blockers for numbers and cautions for
 * the rest.
 */
export function buildPreset(draft: PresetDraft): CataloguePreset {
  const stated = new Set(draft.citations.flatMap((citation) => citation.settles));
  const citations = stated.has('repeated numbers')
    ? draft.citations
    : [...draft.citations, customOfUniqueness];
  const silent = settledParts
    .filter((part) => !stated.has(part))
    .map((part) => draft.open?.[part] ?? openSentences[part]);
  return {
    id: draft.id,
    sport: draft.sport,
    title: draft.title,
    summary: draft.summary,
    inForce: { from: draft.inForce?.from ?? null, to: draft.inForce?.to ?? null },
    ruleSet: buildRuleSet(draft, citations),
    citations,
    open: [...(draft.doubts ?? []), ...silent],
    checkYourBook: writeCheckYourBook(draft.citations),
  };
}

function buildRuleSet(draft: PresetDraft, citations: readonly PresetCitation[]): RuleSet {
  return {
    name: draft.title,
    sport: draft.sport,
    labels: {
      digits: null,
      digitsReason: '',
      mostDigits: 2,
      leadingZeros: 'refused',
      zeroAndDoubleZero: 'both and different',
      weight: 'blocker',
      ...draft.labels,
    },
    uniqueness: { within: 'team', weight: 'blocker' },
    reserved: draft.reserved ?? [],
    reservedWeight: 'blocker',
    roster: { least: 0, most: 200, requiredRoles: [], weight: 'caution', ...draft.roster },
    names: {
      onBack: 'allowed',
      mostLetters: 40,
      letters: 'any',
      sharedSurnameNeedsInitial: false,
      weight: 'caution',
      ...draft.names,
    },
    sizes: { weight: 'caution' },
    citations: citations.map(toCitation),
  };
}

const toCitation = ({ body, document, edition, rule, known }: PresetCitation): Citation => ({
  body,
  document,
  edition,
  rule,
  known,
});

function writeCheckYourBook(citations: readonly PresetCitation[]): string {
  const books = [
    ...new Set(
      citations.map(({ body, document }) =>
        document.startsWith(body) ? document : `${document} of ${body}`,
      ),
    ),
  ];
  const bodies = [...new Set(citations.map(({ body }) => body))];
  return `Check the current ${joinWords(books)} before you rely on this: rules change, and ${joinWords(bodies)} neither made nor approved this preset.`;
}
