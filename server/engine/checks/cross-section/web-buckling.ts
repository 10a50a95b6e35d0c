import type { Sheet } from '../../formula/sheet';
import { epsilonFactor } from '../../steel/classification';
import {
  slenderWebFactor,
  stockyWebFactor,
  webSlendernessInShear,
} from '../../steel/shear-buckling';
import type { SteelSection } from '../steel/section';
import { buckles, websOf, type Direction } from '../steel/shear';

/** chi_w of the webs along a direction; undefined where none is so slender that it buckles in shear. */
export function webFactor(
  section: SteelSection,
  direction: Direction,
  sheet: Sheet,
): number | undefined {
  const webs = websOf(section, direction, sheet);
  if (!webs || !buckles(section, webs, sheet)) return undefined;
  const { f_y, eta } = section;
  const { h_w, t_w } = webs;
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  const lambda_bar_w = sheet.evaluate(webSlendernessInShear, { h_w, t_w, epsilon });
  return lambda_bar_w <= 0.83 / eta
    ? sheet.evaluate(stockyWebFactor, { eta })
    : sheet.evaluate(slenderWebFactor, { lambda_bar_w });
}
