import {
  of,
  point,
  pointOf,
  top,
  type CaseOf,
  type Pick,
  type PublishedCase,
} from './published-case';

type StressCase = CaseOf<'stress'>;

const profile = 'en-recommended';
/** N/mm². */
const KSI = 6.894757293168361;

const worst = of('von-mises', 'sigma_v_Ed');
const safety: Pick = ({ utilisation }) => 1 / (utilisation ?? NaN);

/** Bending stress by the answer's own straight line, v from the centre of a plate. */
const bendingAt =
  (v: number): Pick =>
  (answer) => {
    const centre = pointOf(answer, 'centre');
    const edge = pointOf(answer, 'mid-side-bottom');
    return ((edge.sigma - centre.sigma) / (edge.z ?? NaN)) * v;
  };
const bothAt =
  (v: number): Pick =>
  (answer) =>
    point('centre', 'sigma')(answer) + bendingAt(v)(answer);

const plates: readonly StressCase[] = [
  {
    id: 'GP-01',
    check: 'stress',
    request: {
      profile,
      section: { shape: 'rectangle', b: 15, h: 286.5 },
      material: { type: 'steel', fy: 355 },
      effects: { tension: 609.4, My: 27.12 },
    },
    given: 'v, beyond the edge of the plate: read on the straight line of the answer',
    values: {
      A: top('A'),
      I: top('I_y'),
      sigma_N: point('centre', 'sigma'),
      sigma_M: bendingAt(162.5),
      sigma: bothAt(162.5),
    },
  },
  {
    id: 'GP-02',
    check: 'stress',
    request: {
      profile,
      section: { shape: 'rectangle', b: 15, h: 195 },
      material: { type: 'steel', fy: 355 },
      effects: { tension: 406.9, My: 18.10705 },
    },
    values: {
      A: top('A'),
      I: top('I_y'),
      sigma_N: point('centre', 'sigma'),
      sigma_M: (answer) =>
        point('mid-side-bottom', 'sigma')(answer) - point('centre', 'sigma')(answer),
      sigma: worst,
    },
    rounded: {
      sigma_M: 'the moment is inferred as N times 44.5 mm; 18.11 kN m gives what is printed',
      sigma: 'the moment is inferred as N times 44.5 mm; 18.11 kN m gives what is printed',
    },
  },
];

const OTHER_CRITERION = 'principal stresses and Tresca’s criterion are not of EN 1993-1-1';

const states: readonly StressCase[] = [
  {
    id: 'VM-01',
    check: 'stress',
    request: {
      profile,
      material: { type: 'steel', fy: '39.5 ksi' },
      states: [{ sigmaX: '20 ksi', sigmaZ: '15 ksi', tau: 0 }],
    },
    values: { sigma_vm: of('von-mises', 'sigma_v_Ed', KSI), FS_vm: safety },
    without: { FS_tresca: OTHER_CRITERION },
  },
  {
    id: 'VM-02',
    check: 'stress',
    request: {
      profile,
      material: { type: 'steel', fy: 250 },
      states: [{ sigmaX: 80, sigmaZ: -40, tau: 25 }],
    },
    values: { sigma_vm: worst, FS_vm: safety },
    without: Object.fromEntries(
      ['sigma_a', 'sigma_b', 'tau_max', 'FS_tresca'].map((key) => [key, OTHER_CRITERION]),
    ),
  },
];

/** Torque and radius of the tube in N mm and mm. */
const tube = { torque: 72e3, radius: 21 };

const tubes: readonly StressCase[] = [
  {
    id: 'VM-04',
    check: 'stress',
    request: {
      profile,
      section: { shape: 'CHS', d: 42, t: 5, forming: 'hot-finished' },
      material: { type: 'steel', fy: 276 },
      effects: { tension: 9, My: 1.75 * 0.12, T: 0.072 },
    },
    values: {
      A: top('A', 1e2),
      I: top('I_y', 1e4),
      J: (answer) => (tube.torque * tube.radius) / point('bottom', 'tau')(answer) / 1e4,
      sigma_vm: worst,
      n: safety,
    },
    rounded: { I: 'recalled: J, printed beside it, is twice 10.127' },
  },
];

/** W10x49 of AISC in inches, h and b from memory; the rest as the example states it. */
const w10 = { h: 9.98, b: 10, tw: 0.34, tf: 0.56, Sx: 54.6, J: 1.39, a: 62.1, E: 29000, G: 11200 };
/** Torque at midspan in kip in, and the parts that the example's charts make of it. */
const torque = { T: 90, stVenantAtEnd: 0.28 * 90, bimoment: 0.44 * 90 * w10.a };
const INCH = 25.4;

function twisted(effects: NonNullable<StressCase['request']['effects']>): StressCase['request'] {
  const { h, b, tw, tf, Sx, J, a, E, G } = w10;
  return {
    profile,
    section: {
      shape: 'I',
      h: `${h} in`,
      b: `${b} in`,
      tw: `${tw} in`,
      tf: `${tf} in`,
      properties: {
        Iy: ((Sx * h) / 2) * INCH ** 4,
        It: J * INCH ** 4,
        Iw: ((a ** 2 * G * J) / E) * INCH ** 6,
      },
    },
    // The example states no yield strength; no stress depends on it.
    material: { type: 'steel', fy: 345, E: `${E} ksi`, G: `${G} ksi` },
    effects,
  };
}

const GIVEN =
  'Sx, J, a, the parts of the torque by the charts’ 0.44 and 0.28; h and b are from memory';
const MEMBER = 'a function of the torsion along the member, read from charts: given here';
/** In ksi, whatever its sign. */
const greatest =
  (field: 'sigma' | 'tau'): Pick =>
  ({ points = [] }) =>
    Math.max(...points.map((one) => Math.abs(one[field]))) / KSI;

const torsion: readonly StressCase[] = [
  {
    id: 'TR-03',
    check: 'stress',
    given: GIVEN,
    request: twisted({ My: `${(15 * 180) / 4} kip in` }),
    values: { sigma_b: greatest('sigma') },
    without: { "fn_theta''": MEMBER, "fn_theta'_end": MEMBER },
  },
  {
    id: 'TR-03',
    check: 'stress',
    given: GIVEN,
    request: twisted({ stVenant: 0, warping: 0, bimoment: `${torque.bimoment} kip in2` }),
    values: { sigma_w_mid: greatest('sigma') },
  },
  {
    id: 'TR-03',
    check: 'stress',
    given: GIVEN,
    request: twisted({
      My: `${(15 * 180) / 4} kip in`,
      stVenant: 0,
      warping: 0,
      bimoment: `${torque.bimoment} kip in2`,
    }),
    values: { sigma_total: greatest('sigma') },
    rounded: { sigma_total: 'the source adds 12.4 and 28.0' },
  },
  {
    id: 'TR-03',
    check: 'stress',
    given: GIVEN,
    request: twisted({ stVenant: `${torque.stVenantAtEnd} kip in`, warping: 0, bimoment: 0 }),
    values: {
      tau_t_flange_end: point('flange-centre-top', 'tau', KSI),
      tau_t_web_end: point('web-centre', 'tau', KSI),
    },
  },
  {
    id: 'TR-03',
    check: 'stress',
    given: GIVEN,
    request: twisted({ stVenant: 0, warping: `${torque.T / 2} kip in`, bimoment: 0 }),
    values: { tau_w_mid: greatest('tau') },
  },
];

export const stressCases: readonly PublishedCase[] = [...plates, ...states, ...tubes, ...torsion];
