import { readCell } from '../../roster/cells';
import { type Garment } from '../../roster/player';
import { tidyText } from '../../text/normalise-text';
import { joinWords, quoteText } from '../../text/sentence';
import { type Check } from './roster-context';
import { suggestSizes } from './read-size';

const mostNamed = 12;

/** Every player has an offered size of every garment of the division; sizes of other garments are not looked at. */
export const checkSizes: Check = ({ rules, players, garments }, findings) => {
  const severity = rules.ruleSet.sizes.weight;
  if (severity === 'off' || garments.length === 0) return;
  const offered = garments.map((garment) => new Set(garment.sizes.map((size) => size.code)));
  players.forEach((player, row) => {
    garments.forEach((garment, at) => {
      const given = readCell(player, `size:${garment.code}`);
      if (offered[at]?.has(given)) return;
      const code = tidyText(given) === '' ? 'size-missing' : 'size-not-offered';
      const message =
        code === 'size-missing' ? `${garment.name} has no size yet.` : notOffered(garment, given);
      const suggestions = code === 'size-missing' ? [] : suggestSizes(garment, given);
      findings.push({ code, severity, row, field: 'sizes', garment: garment.code, message, suggestions });
    });
  });
};

function notOffered(garment: Garment, given: string): string {
  const codes = garment.sizes.map((size) => size.code);
  const list = codes.length > mostNamed ? `${codes.length} other sizes` : joinWords(codes);
  return `${garment.name} is not offered in ${quoteText(tidyText(given))}, but in ${list}.`;
}
