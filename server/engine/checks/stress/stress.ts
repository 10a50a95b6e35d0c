import { WorkingSheet } from '../../formula/sheet';
import { ProfileReader } from '../../profiles/reader';
import { equivalentStress } from '../../steel/von-mises';
import { readQuantity } from '../../units/quantity';
import { assemble } from '../answer';
import type { Check, CheckContext } from '../check';
import type { CheckAnswer, MissingItem, StressRequest } from '../contract';
import { readEffects } from '../section/effects';
import { sketchOf } from '../section/sketch';
import { grossStressMissing, pointsOf, stressesOf, wallsOf } from '../section/stresses';
import { vonMises, worstOf, type NamedState } from '../section/von-mises';
import { factorAdvisory, sectionAdvisories } from '../steel/advisories';
import { readSteel } from '../steel/material';
import { readSteelSection } from '../steel/section';
import { verificationAnswer, type Finding } from '../verification';

const NOT_COVERED = [
  'local buckling, and buckling of the member',
  'stress concentrations, residual stresses and second-order effects',
  'fatigue, fire, impact and corrosion',
];
const STANDARDS = ['EN 1993-1-1:2005+A1:2014'];

type BySection = StressRequest & Required<Pick<StressRequest, 'section' | 'effects'>>;

function run(request: StressRequest, context: CheckContext): CheckAnswer {
  return isBySection(request) ? ofSection(request, context) : ofStates(request, context);
}

function isBySection(request: StressRequest): request is BySection {
  return request.section !== undefined && request.effects !== undefined;
}

/** States of stress as they are. */
function ofStates(
  request: StressRequest,
  { profile: revision, detail }: CheckContext,
): CheckAnswer {
  const profile = new ProfileReader(revision);
  const common = new WorkingSheet(null, detail === 'full');
  const { f_y } = readSteel(request.material, undefined, profile, common);
  const gamma_M0 = profile.number('steel.gamma_M0');
  const { clause } = profile.leaf('steel.gamma_M0');
  common.given('gamma_M0', gamma_M0, '1', 'Partial factor of cross-sections', clause);
  const states = (request.states ?? []).map(
    ({ sigmaX = 0, sigmaZ = 0, tau = 0 }, index): NamedState => ({
      id: `state-${index + 1}`,
      title: `State ${index + 1}`,
      sigma_x: readQuantity(sigmaX, 'N/mm^2'),
      sigma_z: readQuantity(sigmaZ, 'N/mm^2'),
      tau: readQuantity(tau, 'N/mm^2'),
      source: 'Given by the caller',
    }),
  );
  const found = worstOf({ f_y, gamma_M0 }, states, detail === 'full');
  return {
    ...assembled([found], profile, common, detail, [], factorAdvisory(gamma_M0)),
    points: states.map(({ id, title, sigma_x, sigma_z, tau }) => ({
      id,
      title,
      y: null,
      z: null,
      sigma: sigma_x,
      sigmaZ: sigma_z,
      tau,
      sigma_v: equivalentStress.compute({ sigma_x_Ed: sigma_x, sigma_z_Ed: sigma_z, tau_Ed: tau }),
    })),
  };
}

/** Effects at the named points of a section. */
function ofSection(request: BySection, { profile: revision, detail }: CheckContext): CheckAnswer {
  const withSteps = detail === 'full';
  const profile = new ProfileReader(revision);
  const common = new WorkingSheet(null, withSteps);
  const section = readSteelSection(request.section, request.material, profile, common);
  const effects = readEffects(request.effects, section);
  const stresses = stressesOf(section, effects);
  const found = vonMises(section, stresses, withSteps);
  const missing = grossStressMissing(section, effects);
  const answer = {
    ...assembled([found], profile, common, detail, missing, sectionAdvisories(section)),
    points: pointsOf(stresses),
  };
  if (!withSteps) return answer;
  return { ...answer, section: sketchOf(section, effects), walls: wallsOf(section, effects) };
}

function assembled(
  findings: readonly Finding[],
  profile: ProfileReader,
  common: WorkingSheet,
  detail: CheckContext['detail'],
  missing: readonly MissingItem[],
  advisories: CheckAnswer['advisories'],
): CheckAnswer {
  return assemble({
    check: 'stress',
    detail,
    profile,
    common,
    verifications: findings.map((one) => verificationAnswer(one, [])),
    steps: findings.flatMap(({ sheet }) => sheet.steps),
    missing,
    waived: [],
    notCovered: NOT_COVERED,
    advisories,
    standards: STANDARDS,
  });
}

/** Von Mises' criterion for states of stress, or at the named points of a section. */
export const stress: Check<StressRequest> = {
  id: 'stress',
  title: 'Stress',
  requestSchema: 'StressRequest',
  run,
  cost: ({ states = [] }) => Math.ceil(states.length / 100),
};
