import { associationFootballPresets } from './association-football';
import { basketballPresets } from './basketball';
import { type CataloguePreset } from './catalogue-preset';
import { fieldHockeyPresets } from './field-hockey';
import { floorballPresets } from './floorball';
import { handballPresets } from './handball';
import { lacrossePresets } from './lacrosse';
import { softballPresets } from './softball';
import { ultimatePresets } from './ultimate';
import { volleyballPresets } from './volleyball';

const presets: readonly CataloguePreset[] = [
  ...associationFootballPresets,
  ...basketballPresets,
  ...fieldHockeyPresets,
  ...floorballPresets,
  ...handballPresets,
  ...lacrossePresets,
  ...softballPresets,
  ...ultimatePresets,
  ...volleyballPresets,
];
const byId = new Map(presets.map((preset) => [preset.id, preset]));

/** Every published code of the catalogue, by sport in alphabetical order. */
export const listCataloguePresets = (): readonly CataloguePreset[] => presets;

/** The published code with this id, or undefined when the catalogue has none. */
export const findCataloguePreset = (id: string): CataloguePreset | undefined => byId.get(id);
