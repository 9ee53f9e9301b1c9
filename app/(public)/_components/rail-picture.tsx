import { NumberRail } from '@/components/number-rail/number-rail';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import { pictureRoster, pictureRules } from './picture-roster';

/** The number rail of the invented roster, up to 59. */
export function RailPicture() {
  const rail = buildNumberRail(pictureRules, pictureRoster).filter((entry) => Number(entry.label) < 60);
  return <NumberRail labels={rail} label="Numbers of the roster in the picture" />;
}
