import { joinWords } from '../text/sentence';
import { type FindingCode } from '../rules/finding';
import { type RuleSet } from '../rules/rule-set';

type LabelRules = RuleSet['labels'];

/**
 * The label another one counts as: 07 is 7 where a leading zero counts for nothing, 00 is 0 where both are one value.
 * Everywhere else a label counts as itself.
 */
export function canonicalLabel(rules: LabelRules, label: string): string {
  if (label.length < 2 || !label.startsWith('0')) return label;
  if (label === '00') return rules.zeroAndDoubleZero === 'one value' ? '0' : '00';
  if (rules.leadingZeros !== 'same as without') return label;
  return label.replace(/^0+(?=[0-9])/, '');
}

/** Digits as a person would write a set of them: "0–5", "1, 3 and 7". */
export function writeDigits(digits: string): string {
  const list = [...new Set(digits)].sort();
  const first = list[0] ?? '';
  const last = list.at(-1) ?? '';
  const run = list.length > 2 && Number(last) - Number(first) === list.length - 1;
  return run ? `${first}–${last}` : joinWords(list);
}

/** Why a label may not be worn at all, whoever asks. */
export type LabelRefusal = { code: FindingCode; message: string };

/**
 * Judges a label by its form alone: number of digits, leading zero, 0 and 00 where neither is worn, and digit set, in
 * that order; null when the form is fine. Whether the ranges name it is asked elsewhere.
 */
export function refuseForm(rules: LabelRules, label: string): LabelRefusal | null {
  if (label.length > rules.mostDigits) {
    const most = rules.mostDigits === 1 ? 'one digit is' : `${rules.mostDigits} digits are`;
    return {
      code: 'too-many-digits',
      message: `${label} has ${label.length} digits, and at most ${most} allowed.`,
    };
  }
  if (label.length > 1 && label.startsWith('0') && label !== '00' && rules.leadingZeros === 'refused') {
    return {
      code: 'leading-zero',
      message: `${label} starts with a zero, and a leading zero is not allowed.`,
    };
  }
  if (rules.zeroAndDoubleZero === 'neither' && /^0+$/.test(label)) {
    return { code: 'number-not-allowed', message: `${label} is not allowed: neither 0 nor 00 is worn.` };
  }
  return refuseDigits(rules, label);
}

function refuseDigits(rules: LabelRules, label: string): LabelRefusal | null {
  const digits = rules.digits;
  if (digits === null) return null;
  const wrong = [...new Set(label)].filter((digit) => !digits.includes(digit));
  if (wrong.length === 0) return null;
  const noun = wrong.length === 1 ? 'the digit' : 'the digits';
  const because = rules.digitsReason.trim().replace(/\.$/, '');
  const tail = because === '' ? '' : `: ${because}`;
  return {
    code: 'digit-not-allowed',
    message: `${label} has ${noun} ${joinWords(wrong)}, and only ${writeDigits(digits)} are allowed${tail}.`,
  };
}
