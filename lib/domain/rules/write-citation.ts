import type { Citation } from './rule-set';

/**
 * Where a value comes from, in one line: body, document, edition and rule, without what is empty and without a body that
 * its document names already. What is only common practice says so and nothing else.
 */
export function writeCitation(
  citation: Pick<Citation, 'body' | 'document' | 'edition' | 'rule' | 'known'>,
): string {
  const { body, document, edition, rule, known } = citation;
  if (known === 'common practice') return 'Common practice, no source';
  const named = document.startsWith(body) ? [document] : [body, document];
  return [...named, edition, rule].filter((part) => part !== '').join(', ');
}

const knownSentences: Record<Citation['known'], string> = {
  read: 'read in the document',
  'quoted by others': 'as quoted by others',
  'from memory': 'from memory',
  'common practice': 'common practice',
  "the league's own": 'the league’s own',
};

/** How well a value is known, in words for a person. */
export const sayHowKnown = (known: Citation['known']): string => knownSentences[known];
