import { type Check, nameRows } from './roster-context';
import { suggestFreeLabels } from './suggest-labels';

/** Where 0 and 00 may not both be worn, everybody who wears one while another player wears the other is told. */
export const checkZeros: Check = (context, findings) => {
  const { zeroAndDoubleZero, weight: severity } = context.rules.ruleSet.labels;
  if (severity === 'off' || zeroAndDoubleZero !== 'not both') return;
  const zeros = context.rowsByKey.get('0');
  const doubleZeros = context.rowsByKey.get('00');
  if (zeros === undefined || doubleZeros === undefined) return;
  const report = (rows: readonly number[], label: string, others: readonly number[], other: string): void => {
    const names = nameRows(context, others);
    const message = `0 and 00 may not both be on one roster, and ${names} ${others.length === 1 ? 'wears' : 'wear'} ${other}.`;
    for (const row of rows) {
      const suggestions = suggestFreeLabels(context, row, label);
      findings.push({ code: 'zero-and-double-zero', severity, row, field: 'number', message, suggestions });
    }
  };
  report(zeros, '0', doubleZeros, '00');
  report(doubleZeros, '00', zeros, '0');
};
