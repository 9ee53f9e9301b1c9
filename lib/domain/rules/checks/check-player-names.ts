import { foldText, tidyText } from '../../text/normalise-text';
import { joinWords } from '../../text/sentence';
import { type Check } from './roster-context';

/** The form in which two names are the same person's: folded, "Dunmore, Pip" turned round to "pip dunmore". */
function nameKey(name: string): string {
  const folded = foldText(name);
  const comma = folded.indexOf(',');
  return comma < 0 ? folded : `${folded.slice(comma + 1).trim()} ${folded.slice(0, comma).trim()}`.trim();
}

/**
 * Every player has a name, because a bag label needs one (always a blocker), and nobody is listed twice (always a
 * caution: two people may share a name). No rule set can turn these off.
 */
export const checkPlayerNames: Check = ({ players }, findings) => {
  const rowsByName = new Map<string, number[]>();
  players.forEach((player, row) => {
    const name = nameKey(player.name);
    const rows = rowsByName.get(name);
    if (name === '') {
      const message = `Row ${row + 1} has no player's name. The bag label needs one.`;
      findings.push({
        code: 'player-name-missing',
        severity: 'blocker',
        row,
        field: 'name',
        message,
        suggestions: [],
      });
    } else if (rows === undefined) rowsByName.set(name, [row]);
    else rows.push(row);
  });
  if (rowsByName.size === players.length) return;
  for (const rows of rowsByName.values()) {
    if (rows.length < 2) continue;
    for (const row of rows) {
      const others = rows.filter((other) => other !== row).map((other) => String(other + 1));
      const where = others.length === 1 ? 'row' : 'rows';
      const message = `${tidyText(players[row]?.name ?? '')} is also in ${where} ${joinWords(others)}. Take one off, or keep both if they are two people.`;
      findings.push({
        code: 'player-repeated',
        severity: 'caution',
        row,
        field: 'name',
        message,
        suggestions: [],
      });
    }
  }
};
