import { describe, expect, it } from 'vitest';
import { listAllowedLabels } from '@/lib/domain/numbers/allowed-labels';
import { makeRuleSet, type RuleSetChanges } from '../../../factories/rule-set';

const list = (changes: RuleSetChanges): string => listAllowedLabels(makeRuleSet(changes)).join(' ');

describe('listAllowedLabels is the ranges less what the other rules take away', () => {
  it('keeps wearing order with 00 first', () => {
    expect(list({ labels: { allowed: '10, 1-3, 0, 00' } })).toBe('00 0 1 2 3 10');
  });
  it('takes away labels with a digit outside the set', () => {
    expect(list({ labels: { allowed: '4-7, 14-16', digits: '012345' } })).toBe('4 5 14 15');
  });
  it('takes away labels with too many digits', () => {
    expect(list({ labels: { allowed: '8-11, 98-101', mostDigits: 2 } })).toBe('8 9 10 11 98 99');
  });
  it('takes away leading zeros where they are refused, but leaves 00 to its own rule', () => {
    expect(list({ labels: { allowed: '00, 06-08, 8', leadingZeros: 'refused' } })).toBe('00 8');
  });
  it('shows 7 for 07 where a leading zero counts for nothing', () => {
    expect(list({ labels: { allowed: '07, 8', leadingZeros: 'same as without' } })).toBe('7 8');
  });
  it('keeps 07 and 7 apart where leading zeros are allowed', () => {
    expect(list({ labels: { allowed: '07, 7', leadingZeros: 'allowed' } })).toBe('07 7');
  });
  it('takes away 0 and 00 where neither is worn', () => {
    expect(list({ labels: { allowed: '00, 0-2', zeroAndDoubleZero: 'neither' } })).toBe('1 2');
  });
  it('is empty when the ranges cannot be read', () => {
    expect(list({ labels: { allowed: 'any' } })).toBe('');
  });
});
