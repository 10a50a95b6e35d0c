import type { Page } from 'playwright-core';
import type { OpenOptions } from './browser';
import { answerOf, check, field } from './element';
import { openAll, type State } from './states';

const steel = { type: 'steel', grade: 'S275' };
const ub = 'UB 457x191x67';

/** Cross-sections and stresses whose answers are known by their status. */
export const requests = {
  section: { section: ub, material: steel, effects: { compression: 250, My: 180, Vz: 300 } },
  failing: { section: ub, material: steel, effects: { compression: 800, My: 380, Vz: 300 } },
  /** Holes in a section that is bent are not taken off its bending. */
  holes: { section: ub, material: steel, effects: { tension: 250, My: 120 }, netArea: 7000 },
  /** A welded girder whose web and flanges buckle before they yield. */
  slender: {
    section: { shape: 'I', h: 1200, b: 400, tw: 6, tf: 12, r: 5, fabrication: 'welded' },
    material: { type: 'steel', grade: 'S355' },
    effects: { compression: 300, My: 900 },
  },
  tube: {
    section: { shape: 'RHS', h: 250, b: 150, t: 8, forming: 'hot-finished' },
    material: steel,
    effects: { compression: 200, My: 60, Mz: 25, Vz: 120, T: 12 },
    vonMises: true,
  },
  stress: { section: ub, material: steel, effects: { compression: 250, My: 180, Vz: 300 } },
  overstressed: { section: ub, material: steel, effects: { compression: 250, My: 380, Vz: 300 } },
  slenderStress: {
    section: { shape: 'I', h: 1200, b: 400, tw: 6, tf: 12, r: 5, fabrication: 'welded' },
    material: { type: 'steel', grade: 'S355' },
    effects: { My: 900 },
  },
  states: {
    material: steel,
    states: [
      { sigmaX: 100, tau: 20 },
      { sigmaX: 180, sigmaZ: -40, tau: 65 },
    ],
  },
} as const;

const section = (value?: object): OpenOptions => ({
  element: 'headtree-section',
  ...(value && { value, attributes: 'label="at prop 2"' }),
});
const stress = (value?: object): OpenOptions => ({
  element: 'headtree-stress',
  ...(value && { value, attributes: 'label="at prop 2"' }),
});
const { holes, failing, slender, tube, overstressed, slenderStress, states } = requests;

const isThere = (page: Page): Promise<void> => check(page).getByText('Not checked yet').waitFor();

/** Every state of the cross-section and of the stress that a person can meet. */
export const sectionStates: Readonly<Record<string, State>> = {
  'section empty': { options: section(), reach: isThere },
  'section pass': { options: section(requests.section), status: 'pass', reach: answerOf },
  'section fail': { options: section(failing), status: 'fail', reach: answerOf },
  'section incomplete': { options: section(holes), status: 'incomplete', reach: answerOf },
  'section of class 4': { options: section(slender), status: 'pass', reach: answerOf },
  'section hollow': { options: section(tube), status: 'pass', reach: openAll },
  'section fault beside a field': {
    options: section(requests.section),
    reach: async (page) => {
      await answerOf(page);
      await field(page, 'N, compression').fill('-1,250');
      await page.locator('[aria-invalid="true"]').first().waitFor();
    },
  },
  'stress empty': { options: stress(), reach: isThere },
  'stress pass': { options: stress(requests.stress), status: 'pass', reach: answerOf },
  'stress fail': { options: stress(overstressed), status: 'fail', reach: answerOf },
  'stress incomplete': { options: stress(slenderStress), status: 'incomplete', reach: answerOf },
  'stress states': { options: stress(states), status: 'pass', reach: openAll },
};
