import { WorkingSheet } from '../../formula/sheet';
import { ProfileReader } from '../../profiles/reader';
import { assemble } from '../answer';
import type { Check, CheckContext } from '../check';
import type { CheckAnswer, WalerRequest } from '../contract';
import { combinationLine } from '../continuous/combination-lines';
import { diagramsOf } from '../continuous/diagrams';
import { readLayout } from '../continuous/geometry';
import { SELF_WEIGHT } from '../continuous/loads';
import { readLoadSets } from '../continuous/load-sets';
import { reactionsOf } from '../continuous/reactions';
import { solveCases } from '../continuous/solve';
import { notCovered } from '../refuse';
import { verificationAnswer, type Finding } from '../verification';
import { advisoriesOf } from './advisories';
import { limitsOf, verifyDeflections } from './deflection';
import { strengthEffects } from './effects';
import { mechanismOf } from './mechanism';
import { missingOf, readWaivers } from './owed';
import { ownWeight } from './own-weight';
import { readWalerSection } from './section';
import { verifyStrength } from './strength';

const NOT_COVERED = [
  'connections and splices',
  'stiffeners',
  'bending of flanges and plates under the load',
  'sag of the waler under its own weight',
  'the props, the ground and the stability of the whole',
  'fatigue, fire, impact and corrosion',
];

function run(request: WalerRequest, { profile: revision, detail }: CheckContext): CheckAnswer {
  refuseWhatIsNotMade(request);
  const withSteps = detail === 'full';
  const profile = new ProfileReader(revision);
  const common = new WorkingSheet(null, withSteps);
  const waived = readWaivers(request.waive);
  const layout = readLayout(request);
  const section = readWalerSection(request.section, request.material, profile, common);
  const weighs = request.selfWeight !== false;
  const own = { name: SELF_WEIGHT, nature: 'permanent', neverFavourable: true } as const;
  const sets = readLoadSets(request, layout, profile, weighs ? [own] : []);
  const geometry = {
    ...layout,
    flexuralRigidity: (section.E * section.properties.I_y) / section.share,
  };
  const solved = solveCases(geometry, sets, request.supports ?? 'compression-only');
  const { cases } = solved;
  const mechanism = mechanismOf(cases, withSteps);
  const weight = ownWeight(request, layout, section);
  const strength = verifyStrength(
    section,
    strengthEffects(cases, section.share, weight),
    withSteps,
  );
  const deflections = waived.some(({ verification }) => verification === 'deflection')
    ? []
    : verifyDeflections(cases, limitsOf(request.deflectionLimit), withSteps);
  const findings: Finding[] = [
    ...mechanism,
    // A member that cannot stand has no bending resistance to set against.
    ...strength.filter(({ id }) => !mechanism.some((one) => one.id === id)),
    ...deflections,
  ];
  const frame = cases[0]?.source.units.beam.frame;
  const supports = frame?.supports ?? [];
  return assemble({
    check: 'waler',
    detail,
    profile,
    common,
    verifications: findings.map((one) => verificationAnswer(one, supports)),
    steps: findings.flatMap(({ sheet }) => sheet.steps),
    missing: missingOf(request, waived, solved, deflections.length > 0),
    waived,
    notCovered: NOT_COVERED,
    advisories: advisoriesOf(request, section, cases),
    standards: ['EN 1990:2002+A1:2005', 'EN 1993-1-1:2005+A1:2014'],
    member: {
      reactions: frame ? reactionsOf(frame, cases) : [],
      combinations: () => cases.map(combinationLine),
      diagrams: () => diagramsOf(cases, section.share),
    },
  });
}

/** What the contract has for a waler and this version does not make. */
function refuseWhatIsNotMade(request: WalerRequest): void {
  if ((request.thrust ?? []).length > 0) {
    notCovered('/thrust', 'Thrust along the waler', 'EN 1993-1-1 6.2.9 and 6.3.3');
  }
  if (request.lossOfProp !== undefined && request.lossOfProp !== false) {
    notCovered('/lossOfProp', 'Loss of a prop', 'EN 1990 6.4.3.3');
  }
}

/** Arrangements × spans, squared by the number of sources: what a request may come to. */
function cost(request: WalerRequest): number {
  const lists = request.loads
    ? [request.loads]
    : (request.loadSets ?? []).map(({ loads }) => loads);
  const spans = request.spans.length + 2;
  return lists.reduce((sum, loads) => {
    const permanent = new Set(
      loads.filter(({ nature }) => nature === 'permanent').map(({ name }) => name),
    );
    const variable = new Set(
      loads.filter(({ nature }) => nature === 'variable').map(({ name }) => name),
    );
    const subsets = 1 + variable.size * 2 ** Math.max(variable.size - 1, 0);
    const patterns = variable.size > 0 ? 2 * spans + 2 : 1;
    return sum + 2 ** permanent.size * subsets * patterns * (spans + loads.length);
  }, 0);
}

/** A steel waler over props: bending, shear, bending with shear and own weight, deflection. */
export const waler: Check<WalerRequest> = {
  id: 'waler',
  title: 'Waler over props',
  requestSchema: 'WalerRequest',
  run,
  cost,
};
