import { foldText, tidyText } from '../../text/normalise-text';
import { joinWords } from '../../text/sentence';
import { type Reservation } from '../compile-rule-set';
import { type Check } from './roster-context';
import { suggestFreeLabels } from './suggest-labels';

const because = (reservation: Reservation): string => {
  const reason = tidyText(reservation.reason).replace(/\.$/, '');
  return reason === '' ? '' : `: ${reason}`;
};

/**
 * Numbers set aside are worn only by the roles they are set aside for. A player without a role is asked for it; a
 * player with another role, or anybody where no role may wear it, is offered other numbers.
 */
export const checkReserved: Check = (context, findings) => {
  const { reserved, ruleSet, unreadableReserved } = context.rules;
  const severity = ruleSet.reservedWeight;
  if (severity === 'off') return;
  if (unreadableReserved !== null) {
    const message = `Some numbers set aside can't be read, so they were not checked. ${unreadableReserved}`;
    findings.push({
      code: 'number-reserved',
      severity,
      row: null,
      field: 'roster',
      message,
      suggestions: [],
    });
  }
  if (reserved.size === 0) return;
  context.keys.forEach((key, row) => {
    const reservation = key === null ? undefined : reserved.get(key);
    if (reservation === undefined) return;
    const reading = context.readings[row];
    const label = reading?.ok === true ? reading.label : '';
    const role = tidyText(context.players[row]?.role ?? '');
    if (reservation.keptBack) {
      const message = `${label} is kept back and nobody may wear it${because(reservation)}.`;
      const suggestions = suggestFreeLabels(context, row, label);
      findings.push({ code: 'number-reserved', severity, row, field: 'number', message, suggestions });
    } else if (role === '') {
      const message = `${label} is only for the role ${joinWords(reservation.roles, 'or')}${because(reservation)}. Give the role, or another number.`;
      findings.push({
        code: 'number-needs-role',
        severity,
        row,
        field: 'role',
        message,
        suggestions: [...reservation.roles],
      });
    } else if (!reservation.folded.has(foldText(role))) {
      const message = `${label} is only for the role ${joinWords(reservation.roles, 'or')}, not for ${role}${because(reservation)}.`;
      const suggestions = suggestFreeLabels(context, row, label);
      findings.push({ code: 'number-reserved', severity, row, field: 'number', message, suggestions });
    }
  });
};
