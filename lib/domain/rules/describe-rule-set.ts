import { writeDigits } from '../numbers/label-rules';
import { writeLabels } from '../numbers/parse-labels';
import { countOf } from '../text/count-of';
import { joinWords } from '../text/sentence';
import { compileRuleSet, type CompiledRuleSet } from './compile-rule-set';
import { type RuleSet, type RuleWeight } from './rule-set';

/**
 * A rule set as sentences a coordinator would say, in a fixed order: numbers, repeats, numbers set aside, roster, names,
 * sizes. Rules that are off say so; rules that only caution end with it.
 */
export function describeRuleSet(rules: RuleSet | CompiledRuleSet): string[] {
  const compiled = compileRuleSet(rules);
  return [
    ...describeNumbers(compiled),
    describeUniqueness(compiled.ruleSet),
    ...describeReserved(compiled.ruleSet),
    ...describeRoster(compiled.ruleSet),
    ...describeNames(compiled.ruleSet),
    weigh(
      compiled.ruleSet.sizes.weight,
      'Every player needs an offered size of each garment.',
      'Sizes are not checked.',
    ),
  ];
}

function weigh(weight: RuleWeight, says: string, off: string): string {
  if (weight === 'off') return off;
  return weight === 'caution' ? `${says} This only cautions.` : says;
}

const leadingZeroSentences: Record<RuleSet['labels']['leadingZeros'], string> = {
  refused: 'A leading zero, as in 07, is refused.',
  'same as without': 'A leading zero makes no difference: 07 is 7.',
  allowed: 'A leading zero makes another number: 07 is not 7, and may be worn where the list names it.',
};

const zeroSentences: Record<RuleSet['labels']['zeroAndDoubleZero'], string> = {
  'both and different': '0 and 00 are two different numbers.',
  'not both': '0 and 00 may not both be on one roster.',
  'one value': '0 and 00 are the same number.',
  neither: 'Neither 0 nor 00 is worn.',
};

function describeNumbers({ ruleSet, labels, unreadableLabels }: CompiledRuleSet): string[] {
  const { weight, digits, digitsReason, leadingZeros, zeroAndDoubleZero } = ruleSet.labels;
  if (weight === 'off') return ['Numbers are not checked.'];
  if (unreadableLabels !== null) return [`The allowed numbers can't be read. ${unreadableLabels}`];
  const reason = digitsReason.trim().replace(/\.$/, '');
  const sentences = [
    weigh(
      weight,
      labels.length === 0 ? 'No number may be worn.' : `Players wear ${writeLabels(labels)}.`,
      '',
    ),
  ];
  if (digits !== null)
    sentences.push(`Only the digits ${writeDigits(digits)}${reason === '' ? '' : `: ${reason}`}.`);
  sentences.push(leadingZeroSentences[leadingZeros]);
  if (zeroAndDoubleZero !== 'both and different' || (labels.includes('0') && labels.includes('00'))) {
    sentences.push(zeroSentences[zeroAndDoubleZero]);
  }
  return sentences;
}

function describeUniqueness({ uniqueness }: RuleSet): string {
  if (uniqueness.within === 'none') return 'Players of a team may share a number.';
  return weigh(
    uniqueness.weight,
    'No two players of a team wear the same number.',
    'Repeated numbers are not checked.',
  );
}

function describeReserved({ reserved, reservedWeight }: RuleSet): string[] {
  return reserved.map(({ labels, roles, reason }) => {
    const who = roles.length === 0 ? 'nobody' : `the role ${joinWords(roles, 'or')}`;
    const says = `${labels} is for ${who}: ${reason.trim().replace(/\.$/, '')}.`;
    return weigh(reservedWeight, says, `${says} This is not checked.`);
  });
}

function describeRoster({ roster }: RuleSet): string[] {
  const { least, most, weight } = roster;
  if (weight === 'off') return ['The size of the roster and its roles are not checked.'];
  const size =
    least === most ? `exactly ${countOf(most, 'player')}` : `${least} to ${countOf(most, 'player')}`;
  const roles = roster.requiredRoles.map(
    ({ role, least: needed }) => `At least ${countOf(needed, 'player')} with the role ${role}.`,
  );
  return [weigh(weight, `A roster holds ${size}.`, ''), ...roles];
}

function describeNames({ names }: RuleSet): string[] {
  if (names.weight === 'off') return ['Names on the back are not checked.'];
  if (names.onBack === 'not allowed') return [weigh(names.weight, 'No name is worn on the back.', '')];
  const wanted = names.onBack === 'wanted' ? 'Every player needs a name' : 'A player may wear a name';
  const letters = names.letters === 'latin' ? 'Latin letters' : 'letters';
  const length = `${wanted} on the back, at most ${countOf(names.mostLetters, letters, letters)}.`;
  const shared = 'Two players with the same name on the back each need an initial.';
  return [weigh(names.weight, length, ''), ...(names.sharedSurnameNeedsInitial ? [shared] : [])];
}
