import { type Check, nameRows } from './roster-context';
import { suggestFreeLabels } from './suggest-labels';

/** No two players of a team wear the same number; each of them is told whose number it also is. */
export const checkUniqueness: Check = (context, findings) => {
  const severity = context.rules.ruleSet.uniqueness.weight;
  if (!context.rules.unique || severity === 'off') return;
  if (context.rowsByKey.size === context.players.length) return;
  for (const [key, rows] of context.rowsByKey) {
    if (rows.length < 2) continue;
    for (const row of rows) {
      const reading = context.readings[row];
      const label = reading?.ok === true ? reading.label : key;
      const others = rows.filter((other) => other !== row);
      const allAlike = others.every((other) => {
        const theirs = context.readings[other];
        return theirs?.ok === true && theirs.label === label;
      });
      const owners = nameRows(context, others, "'s");
      const message = allAlike
        ? `${label} is also ${owners}.`
        : `${label} counts as the same number as ${owners}.`;
      const suggestions = suggestFreeLabels(context, row, label);
      findings.push({ code: 'number-repeated', severity, row, field: 'number', message, suggestions });
    }
  }
};
