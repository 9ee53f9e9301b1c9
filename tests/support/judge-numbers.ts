import { listAllowedLabels } from '@/lib/domain/numbers/allowed-labels';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { makeLines } from '../factories/rule-set';

const getRules = (presetId: string) => {
  const preset = findCataloguePreset(presetId);
  if (preset === undefined) throw new Error(`The catalogue has no ${presetId}.`);
  return preset.ruleSet;
};

/** The codes of what the preset finds about the numbers of a roster, each once. */
export function judgeNumbers(presetId: string, numbers: readonly string[], role = ''): string[] {
  const players = makeLines(...numbers).map((player) => ({ ...player, role }));
  const { findings } = checkRoster(getRules(presetId), players, []);
  return [...new Set(findings.map(({ code }) => code))];
}

/** The numbers from 0 to 999, with 00 to 09, that one player alone may wear under the preset: each label is tried. */
export function listLegalAlone(presetId: string, role = ''): string[] {
  const zeros = Array.from({ length: 10 }, (_, digit) => `0${digit}`);
  const plain = Array.from({ length: 1000 }, (_, value) => String(value));
  return [...zeros, ...plain].filter((number) => judgeNumbers(presetId, [number], role).length === 0);
}

/** How many labels the preset lists. */
export const countLabels = (presetId: string): number => listAllowedLabels(getRules(presetId)).length;
