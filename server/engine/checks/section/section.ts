import { silentSheet, WorkingSheet } from '../../formula/sheet';
import { ProfileReader } from '../../profiles/reader';
import { readQuantity } from '../../units/quantity';
import { assemble } from '../answer';
import type { Check, CheckContext } from '../check';
import type {
  AdvisoryAnswer,
  CheckAnswer,
  MissingItem,
  SectionEffects,
  SectionRequest,
  VerificationId,
} from '../contract';
import { verifyCrossSection } from '../cross-section/verify';
import { refuse } from '../refuse';
import { sectionAdvisories } from '../steel/advisories';
import { readSteelSection, type SteelSection } from '../steel/section';
import { verificationAnswer } from '../verification';
import { curvesOf } from './curves';
import { readEffects, sizes, type SignedEffects } from './effects';
import { sketchOf } from './sketch';
import { grossStressMissing, pointsOf, stressesOf, wallsOf } from './stresses';
import { vonMises } from './von-mises';

const NOT_COVERED = [
  'buckling of the member: flexural, torsional, lateral torsional',
  'connections, splices, holes but those of a net area in tension',
  'transverse force, and stiffeners at supports that a web slender in shear needs',
  'shear lag and distortion of the cross-section',
  'fatigue, fire, impact and corrosion',
];

function run(request: SectionRequest, { profile: revision, detail }: CheckContext): CheckAnswer {
  const withSteps = detail === 'full';
  const profile = new ProfileReader(revision);
  const common = new WorkingSheet(null, withSteps);
  const section = readSteelSection(request.section, request.material, profile, common);
  const signed = readEffects(request.effects, section);
  const effects = sizes(signed);
  const netArea = readNetArea(request, section);
  const findings = verifyCrossSection(section, effects, {
    ...(netArea === undefined ? {} : { netArea }),
    withSteps,
  });
  const stresses = stressesOf(section, signed);
  if (request.vonMises === true) findings.push(vonMises(section, stresses, withSteps));
  const answer = assemble({
    check: 'section',
    detail,
    profile,
    common,
    verifications: findings.map((one) => verificationAnswer(one, [])),
    steps: findings.flatMap(({ sheet }) => sheet.steps),
    missing: [
      ...(findings.length === 0 ? [nothingActs(request)] : []),
      ...missingOf(request, section, signed),
      ...(request.vonMises === true ? grossStressMissing(section, signed) : []),
    ],
    waived: [],
    notCovered: NOT_COVERED,
    advisories: advisoriesOf(request, section, signed),
    standards: ['EN 1993-1-1:2005+A1:2014', 'EN 1993-1-5:2006'],
  });
  if (!withSteps) return answer;
  return {
    ...answer,
    section: sketchOf(section, signed),
    points: pointsOf(stresses),
    walls: wallsOf(section, signed),
    interaction: curvesOf(section, effects),
  };
}

function readNetArea({ netArea }: SectionRequest, section: SteelSection): number | undefined {
  if (netArea === undefined) return undefined;
  const area = readQuantity(netArea, 'mm^2');
  if (area > section.properties.A) {
    refuse(
      'contradiction',
      '/netArea',
      `The net area cannot exceed the area, ${section.properties.A.toFixed(0)} mm².`,
    );
  }
  return area;
}

const verificationOf: Readonly<Record<keyof SectionEffects, VerificationId>> = {
  compression: 'compression',
  tension: 'tension',
  My: 'bending-y',
  Mz: 'bending-z',
  Vz: 'shear-z',
  Vy: 'shear-y',
  T: 'torsion',
  stVenant: 'torsion',
  warping: 'torsion',
  bimoment: 'torsion',
};

/** Effects of zero verify nothing, which is no pass. */
function nothingActs({ effects }: SectionRequest): MissingItem {
  const [field = 'My'] = Object.keys(effects) as (keyof SectionEffects)[];
  return {
    pointer: `/effects/${field}`,
    verification: verificationOf[field],
    reason: 'Every effect is zero: nothing was verified.',
  };
}

/** What the request asks for and cannot be made from it. */
function missingOf(
  request: SectionRequest,
  section: SteelSection,
  effects: SignedEffects,
): MissingItem[] {
  const missing: MissingItem[] = [];
  const bent = effects.M_y !== 0 || effects.M_z !== 0;
  if (request.netArea === undefined) return missing;
  if (effects.tension > 0 && section.useUltimate(silentSheet) === undefined) {
    const byStrength = 'fy' in request.material;
    missing.push({
      pointer: byStrength ? '/material/fu' : '/material/grade',
      verification: 'tension',
      reason: byStrength
        ? 'The net section needs the ultimate strength.'
        : 'The net section needs an ultimate strength, and that of this quality is not held: give fy and fu.',
      clause: 'EN 1993-1-1 6.2.3(2)b',
    });
  }
  if (bent) {
    missing.push({
      pointer: '/netArea',
      verification: effects.M_y !== 0 ? 'bending-y' : 'bending-z',
      reason:
        'Where the holes stand in a bent section is not known: they are not taken off bending.',
      clause: 'EN 1993-1-1 6.2.5(4)',
    });
  }
  if (effects.V_z !== 0 || effects.V_y !== 0) {
    missing.push({
      pointer: '/netArea',
      verification: effects.V_z !== 0 ? 'shear-z' : 'shear-y',
      reason: 'Holes are not taken off the shear area.',
      clause: 'EN 1993-1-1 6.2.6(7)',
    });
  }
  return missing;
}

function advisoriesOf(
  request: SectionRequest,
  section: SteelSection,
  effects: SignedEffects,
): AdvisoryAnswer[] {
  const list = sectionAdvisories(section);
  if (section.count > 1 || section.share < 1) {
    list.push({
      code: 'effects-of-one-member',
      severity: 'caution',
      message: 'The effects are taken as those of one member, not shared out.',
    });
  }
  if (request.netArea !== undefined && effects.tension === 0) {
    list.push({
      code: 'net-area-unused',
      severity: 'info',
      message: 'The net area counts in tension only, and there is none.',
      clause: 'EN 1993-1-1 6.2.3(2)b',
    });
  }
  const { shape } = section.shape;
  const sheared = effects.V_z !== 0 || effects.V_y !== 0;
  if (sheared && (shape === 'channel' || shape === 'angle')) {
    list.push({
      code: 'shear-centre',
      severity: 'caution',
      message:
        'Shear is taken through the shear centre. A load beside it turns the section: give what it makes as T.',
      clause: 'EN 1993-1-1 6.2.7',
    });
  }
  if (grossStressMissing(section, effects).length > 0) {
    list.push({
      code: 'stress-of-gross-section',
      severity: 'info',
      message:
        'The section is class 4: stresses at its points are those of the gross section, and mislead.',
      clause: 'EN 1993-1-1 6.2.1(4)',
    });
  }
  if (effects.B !== 0) {
    list.push({
      code: 'bimoment-adds',
      severity: 'info',
      message:
        'The bimoment is taken to add to whatever acts at every tip: the stresses are an envelope, not one state.',
    });
    list.push({
      code: 'warping-elastic',
      severity: 'info',
      message: 'With a bimoment bending is verified elastic, as one sum.',
      clause: 'EN 1993-1-1 6.2.7(5)',
    });
  }
  return list;
}

/** A cross-section under effects that act together: EN 1993-1-1 6.2. */
export const section: Check<SectionRequest> = {
  id: 'section',
  title: 'Cross-section',
  requestSchema: 'SectionRequest',
  run,
  cost: () => 1,
};
