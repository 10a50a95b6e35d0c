import type { SectionEffects, SectionInput } from '../../server/engine/checks/contract';
import { of, step, top, type CaseOf, type PublishedCase } from './published-case';

type Profile = 'en-recommended' | 'uk-na';
type SectionCase = CaseOf<'section'>;

const RECOMMENDED: Profile = 'en-recommended';
const UK: Profile = 'uk-na';

/** Where a source states no effect, one that is there for the check to have something to verify. */
const ANY = 1;

const asked = (
  section: SectionInput,
  fy: number,
  effects: SectionEffects,
  profile: Profile = RECOMMENDED,
): SectionCase['request'] => ({ profile, section, material: { type: 'steel', fy }, effects });

const pile = 'UBP 356x368x174';
const pileStrength = 345;
/** N_pl,Rd in kN as the same table prints it (CL-03). */
const pileSquash = 7640;

/** The table of M_N,y,Rd: one request for each n, N_Ed being n times the table's N_pl,Rd. */
const reducedByThrust = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9].map((tenths): SectionCase => {
  const compression = (tenths * pileSquash) / 10;
  return {
    id: 'NM-02',
    check: 'section',
    request: asked(pile, pileStrength, { compression, My: ANY }, UK),
    given: 'N_Ed is n times the N_pl,Rd that the same table prints',
    values: {
      [`MN,y,Rd@n=0.${tenths}`]:
        tenths === 0 ? of('bending-y', 'M_c_y_Rd') : of('bending-axial-y', 'M_N_y_Rd'),
    },
  };
});

const classes: readonly SectionCase[] = [
  {
    id: 'CL-01',
    check: 'section',
    request: asked('IPE 330', 235, { My: ANY }),
    values: {
      eps: of('bending-y', 'epsilon'),
      c_flange: of('bending-y', 'c_f'),
      'c/tf': of('bending-y', 'c_f_t_f'),
      flange_limit_cl1: of('bending-y', 'c_f_t_f_lim_1'),
      c_web: of('bending-y', 'c_w'),
      'c/tw': of('bending-y', 'c_w_t_w'),
      web_limit_cl1: of('bending-y', 'c_w_t_w_lim_1'),
      class: of('bending-y', 'section_class'),
    },
  },
  {
    id: 'CL-03',
    check: 'section',
    request: asked(pile, pileStrength, { compression: ANY, My: ANY, Mz: ANY }, UK),
    values: {
      class: of('compression', 'section_class'),
      'Npl,Rd': of('compression', 'N_c_Rd'),
      'Mc,y,Rd': of('bending-y', 'M_c_y_Rd'),
      'Mc,z,Rd': of('bending-z', 'M_c_z_Rd'),
    },
  },
  {
    id: 'CL-06',
    check: 'section',
    request: asked('HEB 160', 275, { compression: 100 }),
    values: {
      eps: of('compression', 'epsilon'),
      'd/tw': of('compression', 'c_w_t_w'),
      web_limit_cl1: of('compression', 'c_w_t_w_lim_1_N'),
      c: of('compression', 'c_f'),
      'c/tf': of('compression', 'c_f_t_f'),
      flange_limit_cl1: of('compression', 'c_f_t_f_lim_1'),
    },
  },
  {
    id: 'AN-01',
    check: 'section',
    request: asked('L 150x150x15', 355, { compression: 304.7 }),
    refused: 'class-4',
    values: { class: ({ errors = [] }) => (errors[0]?.code === 'class-4' ? 4 : NaN) },
    without: {
      'h/t': 'a ratio of inputs, and a refusal has no working',
      '(b+h)/2t': 'a ratio of inputs, and a refusal has no working',
      sigma_1:
        'the source bends the angle about its leg, as if I_yz were nought; here about u-u and v-v',
      sigma_2:
        'the source bends the angle about its leg, as if I_yz were nought; here about u-u and v-v',
    },
  },
  {
    id: 'AN-01',
    check: 'section',
    request: asked({ shape: 'angle', h: 135, b: 135, t: 15 }, 355, { compression: ANY }),
    given: 'an angle stocky enough to be answered: its limits depend on f_y alone',
    values: {
      limit_15eps: of('compression', 'h_t_lim_3'),
      'limit_11.5eps': of('compression', 'b_h_2t_lim_3'),
      limit_10eps: of('compression', 'c_f_t_f_lim_2'),
    },
  },
  {
    id: 'C4-01',
    check: 'section',
    request: asked({ shape: 'I', h: 530, b: 305, tw: 5, tf: 15, fabrication: 'welded' }, 355, {
      compression: 4000,
    }),
    given: 'an outstand of b/t = 10 on a section whose web makes it class 4: angles are refused',
    values: {
      k_sigma_leg1: step('k_sigma_f'),
      lambda_p_leg1: step('lambda_bar_p_f'),
      rho_leg1: step('rho_f'),
    },
    without: Object.fromEntries(
      ['psi_leg2', 'k_sigma_leg2', 'lambda_p_leg2', 'rho_leg2'].map((key) => [
        key,
        'outstands are always taken as compressed uniformly',
      ]),
    ),
  },
];

const resistances: readonly SectionCase[] = [
  {
    id: 'RB-03',
    check: 'section',
    request: asked({ designation: 'IPE 450', properties: { Wply: 1702000 } }, 355, { My: 356 }),
    given: 'Wply',
    values: { 'Mpl,y,Rd': of('bending-y', 'M_c_y_Rd') },
  },
  {
    id: 'RB-04',
    check: 'section',
    request: asked(
      { designation: 'IPE 450', properties: { A: 9880 } },
      355,
      { Vz: 118 },
      // The source takes eta as 1.0.
      UK,
    ),
    given: 'A',
    values: {
      Av: of('shear-z', 'A_v_z'),
      'Vpl,Rd': of('shear-z', 'V_pl_z_Rd'),
      '0.5Vpl,Rd': of('shear-z', 'V_pl_z_Rd', 2),
    },
    without: { eta_hw_tw: 'the lower bound of A_v, inside its formula' },
  },
  {
    id: 'RB-07',
    check: 'section',
    request: asked({ designation: 'IPE 330', properties: { Avy: 3680 } }, 355, { Vy: 1.82 }),
    given: 'A_v',
    values: { 'Vpl,Rd': of('shear-y', 'V_pl_y_Rd') },
  },
  {
    id: 'RB-07',
    check: 'section',
    request: asked('IPE 330', 355, { Vy: 1.82 }),
    values: { 'Vpl,Rd': of('shear-y', 'V_pl_y_Rd') },
    made: { Av_y_mm2: { half: 0.5, pick: of('shear-y', 'A_v_y') } },
  },
  {
    id: 'GN-6.4',
    check: 'section',
    request: asked(
      {
        shape: 'channel',
        h: 229,
        b: 88.9,
        tw: 8.6,
        tf: 13.3,
        r: 13.7,
        properties: { A: 4160 },
      },
      275,
      { Vz: ANY },
    ),
    given: 'A',
    values: { Av: of('shear-z', 'A_v_z'), 'Vpl,Rd': of('shear-z', 'V_pl_z_Rd') },
  },
  {
    id: 'TF-01',
    check: 'section',
    request: asked('UB 203x133x25', 275, { Vz: ANY }),
    values: { hw: of('shear-z', 'h_w') },
  },
];

const together: readonly SectionCase[] = [
  {
    id: 'NM-01',
    check: 'section',
    request: asked({ designation: 'IPE 450', properties: { A: 9880 } }, 355, {
      compression: 127,
      My: ANY,
    }),
    given: 'A',
    values: {
      'Nc,Rd': of('compression', 'N_c_Rd'),
      '0.25Npl,Rd': of('bending-axial-y', 'N_lim_1'),
      '0.5hw.tw.fy': of('bending-axial-y', 'N_lim_2'),
    },
  },
  {
    id: 'NM-04',
    check: 'section',
    // The source has A_eff for uniform compression and states it; by N_Ed the web is class 3.
    request: asked({ designation: 'IPE 330', properties: { A: 6095 } }, 355, {
      compression: 1477,
      Mz: 2.86,
    }),
    given: 'A_eff, as A',
    values: {
      N_ratio: ({ verifications }) =>
        verifications.find(({ id }) => id === 'compression')?.utilisation ?? NaN,
      M_ratio: ({ verifications }) =>
        verifications.find(({ id }) => id === 'bending-z')?.utilisation ?? NaN,
      sum: of('bending-axial-z', 'utilisation'),
    },
    rounded: { sum: 'the source adds its rounded ratios' },
    made: { Mz_Rd_kNm: { half: 0.005, pick: of('bending-z', 'M_c_z_Rd') } },
  },
  {
    id: 'GN-6.6',
    check: 'section',
    request: asked({ designation: 'UB 457x191x98', properties: { A: 12500, Wply: 2232000 } }, 235, {
      compression: 1400,
      My: ANY,
    }),
    given: 'A, Wply',
    values: {
      'Npl,Rd': of('bending-axial-y', 'N_pl_Rd'),
      'MN,y,Rd': of('bending-axial-y', 'M_N_y_Rd'),
    },
  },
];

const properties: readonly SectionCase[] = [
  {
    id: 'TF-02',
    check: 'section',
    request: {
      profile: RECOMMENDED,
      section: { shape: 'channel', h: 102, b: 101, tw: 2, tf: 2 },
      material: { type: 'steel', fy: 235, E: 70000, G: 30000 },
      effects: { tension: ANY },
    },
    // The source measures from the web's middle line, the answer from its back.
    values: { x_centroid: (answer) => top('y_c')(answer) - 1 },
    made: {
      A_mm2: { half: 0.5, pick: top('A') },
      Ixx_mm4: { half: 5e3, pick: top('I_y') },
      Iyy_mm4: { half: 5e3, pick: top('I_z') },
      xs_mm: {
        half: 0.05,
        pick: ({ values: { y_c, e_0 } }) => 1 - (y_c?.value ?? NaN) - (e_0?.value ?? NaN),
      },
      J_mm4: { half: 5, pick: top('I_t') },
    },
    without: Object.fromEntries(
      ['P_yy', 'P_xx', 'P_theta', 'coef_P', 'coef_0', 'P_TF'].map((key) => [
        key,
        'a critical load, for the member check',
      ]),
    ),
  },
];

export const sectionCases: readonly PublishedCase[] = [
  ...classes,
  ...resistances,
  ...reducedByThrust,
  ...together,
  ...properties,
];
