import { tidyText } from '../../text/normalise-text';
import { refuseLabel } from '../compile-rule-set';
import { type Check } from './roster-context';
import { suggestFreeLabels, suggestParts } from './suggest-labels';

/**
 * Every player has a number that can be read and that the rules let anybody wear: one finding for each number, the
 * most telling one. Allowed numbers that cannot be read themselves are reported once, for the whole roster.
 */
export const checkNumbers: Check = (context, findings) => {
  const { rules, players, readings } = context;
  const severity = rules.ruleSet.labels.weight;
  if (severity === 'off') return;
  if (rules.unreadableLabels !== null) {
    const message = `The allowed numbers of these rules can't be read, so no number was checked. ${rules.unreadableLabels}`;
    findings.push({
      code: 'number-not-allowed',
      severity,
      row: null,
      field: 'roster',
      message,
      suggestions: [],
    });
  }
  readings.forEach((reading, row) => {
    if (!reading.ok) {
      const name = tidyText(players[row]?.name ?? '');
      const message =
        reading.empty && name !== '' ? `${context.nameOf(row)} has no number yet.` : reading.reason;
      const code = reading.empty ? 'number-missing' : 'number-unreadable';
      const suggestions = reading.empty
        ? suggestFreeLabels(context, row, null)
        : suggestParts(context, row, reading.parts);
      findings.push({ code, severity, row, field: 'number', message, suggestions });
      return;
    }
    if (rules.unreadableLabels !== null) return;
    const refusal = refuseLabel(rules, reading.label);
    if (refusal === null) return;
    const suggestions = suggestFreeLabels(context, row, reading.label);
    findings.push({ ...refusal, severity, row, field: 'number', suggestions });
  });
};
