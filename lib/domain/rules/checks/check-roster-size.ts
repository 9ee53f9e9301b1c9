import { foldText } from '../../text/normalise-text';
import { countOf } from '../../text/count-of';
import { type Check } from './roster-context';

/** The roster holds neither too few nor too many players, and enough players of each role that the rules ask for. */
export const checkRosterSize: Check = ({ rules, players }, findings) => {
  const { least, most, requiredRoles, weight: severity } = rules.ruleSet.roster;
  if (severity === 'off') return;
  const base = { severity, row: null, field: 'roster', suggestions: [] } as const;
  const size = players.length;
  const holds = size === 0 ? 'The roster is empty' : `The roster has ${countOf(size, 'player')}`;
  if (size < least) {
    const message = `${holds}, and at least ${least} ${least === 1 ? 'is' : 'are'} needed: add ${least - size}.`;
    findings.push({ ...base, code: 'roster-too-small', message, suggestions: [] });
  }
  if (size > most) {
    const message = `${holds}, and at most ${most} ${most === 1 ? 'is' : 'are'} allowed: take ${size - most} off.`;
    findings.push({ ...base, code: 'roster-too-large', message, suggestions: [] });
  }
  for (const required of requiredRoles) {
    const role = foldText(required.role);
    const found = players.reduce((count, player) => count + (foldText(player.role) === role ? 1 : 0), 0);
    if (found >= required.least) continue;
    const has = found === 0 ? 'no player has it' : `only ${found} ${found === 1 ? 'has' : 'have'} it`;
    const message = `The role ${required.role} needs at least ${countOf(required.least, 'player')}, and ${has}.`;
    findings.push({ ...base, code: 'role-missing', message, suggestions: [] });
  }
};
