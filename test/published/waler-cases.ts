import type { CheckAnswer, WalerRequest } from '../../server/engine/checks/contract';

/** A published example that a waler's request can state, and where its values stand in the answer. */
export interface WalerCase {
  readonly id: string;
  readonly request: WalerRequest;
  readonly values: Readonly<Record<string, (answer: CheckAnswer) => number>>;
  /** Values that the source reached through rounded ones, each with the reason. */
  readonly rounded?: Readonly<Record<string, string>>;
  /** Published values that the answer does not hold, each with its reason. */
  readonly without?: Readonly<Record<string, string>>;
}

const simple = (value: number, nature: 'permanent' | 'variable' = 'permanent') =>
  nature === 'permanent'
    ? ({ name: 'permanent', nature, kind: 'uniform', value } as const)
    : ({ name: 'imposed', nature, category: 'imposed-b', kind: 'uniform', value } as const);

/** A request that only asks for the section: the loads are not of the example. */
function sectionOnly(section: WalerRequest['section'], fy: number, profile: string): WalerRequest {
  return {
    profile,
    section,
    material: { type: 'steel', fy },
    loadBasis: 'design',
    spans: [1],
    loads: [simple(1)],
  };
}

const of = (id: string, symbol: string) => (answer: CheckAnswer) => {
  const found = answer.verifications.find((one) => one.id === id)?.values[symbol];
  return found?.value ?? NaN;
};
const top =
  (symbol: string, per = 1) =>
  (answer: CheckAnswer) =>
    (answer.values[symbol]?.value ?? NaN) / per;

const OTHER_CHECK = 'belongs to a check that comes later';
const LIMIT = 'a limit of Table 5.2 times epsilon; the ratio and the class it gives are compared';

export const walerCases: readonly WalerCase[] = [
  {
    id: 'SP-01',
    request: sectionOnly('HE 300 B', 235, 'en-recommended'),
    values: { A: top('A', 1e2), Iy: top('I_y', 1e4), Iz: top('I_z', 1e4) },
    rounded: {
      Iy: 'printed to four figures',
      Iz: 'printed to three figures',
    },
  },
  {
    id: 'SP-02',
    request: sectionOnly('IPE 330', 235, 'en-recommended'),
    values: { 'Wpl,y': top('W_pl_y', 1e3), Iz: top('I_z', 1e4), It: top('I_t', 1e4) },
    without: {
      Iw: 'recomputed as I_z h_s²/4; mill catalogues print the flanges alone, as the engine does',
    },
  },
  {
    id: 'CL-01',
    request: sectionOnly('IPE 330', 235, 'en-recommended'),
    values: {
      eps: top('epsilon'),
      'c/tf': top('c_f_t_f'),
      'c/tw': top('c_w_t_w'),
      class: top('section_class'),
    },
    without: {
      c_flange: 'a length on the way to c/tf',
      c_web: 'a length on the way to c/tw',
      flange_limit_cl1: LIMIT,
      web_limit_cl1: LIMIT,
    },
  },
  {
    id: 'CL-03',
    request: sectionOnly('UBP 356x368x174', 345, 'uk-na'),
    values: {
      class: top('section_class'),
      'Mc,y,Rd': of('bending-y', 'M_c_y_Rd'),
      'Mc,z,Rd': of('bending-z', 'M_c_z_Rd'),
      'fyWel,y': (answer) => ((answer.values.W_el_y?.value ?? NaN) * 345) / 1e6,
      'fyWel,z': (answer) => ((answer.values.W_el_z?.value ?? NaN) * 345) / 1e6,
    },
    without: { 'Npl,Rd': OTHER_CHECK },
  },
  {
    id: 'CL-06',
    request: sectionOnly('HEB 160', 275, 'en-recommended'),
    values: { eps: top('epsilon'), 'd/tw': top('c_w_t_w'), 'c/tf': top('c_f_t_f') },
    without: {
      web_limit_cl1: `${OTHER_CHECK} (compression)`,
      c: 'a length on the way to c/tf',
      flange_limit_cl1: LIMIT,
    },
  },
  {
    id: 'RB-01',
    request: {
      profile: 'en-recommended',
      section: 'IPE 330',
      material: { type: 'steel', grade: 'S235' },
      loadBasis: 'characteristic',
      spans: [5.7],
      // The beam's own weight, slab and finishes 2.5 m apart, as the example adds them.
      loads: [simple(0.482 + 2.5 * (2.88 + 0.75)), simple(2.5 * 2.5, 'variable')],
      selfWeight: false,
    },
    values: {
      w_Ed: (answer) => (of('shear-z', 'V_z_Ed')(answer) * 2) / 5.7,
      'My,Ed': of('bending-y', 'M_y_Ed'),
      VEd: of('shear-z', 'V_z_Ed'),
    },
    rounded: {
      'My,Ed': 'the source goes on with w_Ed rounded to 22.28 kN/m',
      VEd: 'the source goes on with w_Ed rounded to 22.28 kN/m',
    },
    without: { gk: 'a sum of inputs', qk: 'a product of inputs' },
  },
  {
    id: 'RB-03',
    request: sectionOnly(
      { designation: 'IPE 450', properties: { Wply: 1702000 } },
      355,
      'en-recommended',
    ),
    values: { 'Mpl,y,Rd': of('bending-y', 'M_c_y_Rd') },
  },
  {
    id: 'RB-04',
    request: sectionOnly({ designation: 'IPE 450', properties: { A: 9880 } }, 355, 'uk-na'),
    values: {
      Av: of('shear-z', 'A_v_z'),
      'Vpl,Rd': of('shear-z', 'V_pl_z_Rd'),
      '0.5Vpl,Rd': (answer) => 0.5 * of('shear-z', 'V_pl_z_Rd')(answer),
    },
    without: { eta_hw_tw: 'the lower bound of A_v, inside its formula' },
  },
  {
    id: 'RB-07',
    request: sectionOnly(
      { designation: 'IPE 330', properties: { Avy: 3680 } },
      355,
      'en-recommended',
    ),
    values: { 'Vpl,Rd': of('shear-y', 'V_pl_y_Rd') },
  },
  {
    id: 'LT-07',
    request: sectionOnly('610x229x125 UKB', 265, 'uk-na'),
    values: {
      'cf/(tf eps)': (answer) => top('c_f_t_f')(answer) / top('epsilon')(answer),
      'cw/(tw eps)': (answer) => top('c_w_t_w')(answer) / top('epsilon')(answer),
    },
    rounded: { 'cw/(tw eps)': 'the source takes c_w/t_w as 46.0 and epsilon as 0.942' },
    without: {
      lambda_z: OTHER_CHECK,
      lambda_LT: OTHER_CHECK,
      phi_LT: OTHER_CHECK,
      chi_LT: OTHER_CHECK,
      'Mb,Rd': OTHER_CHECK,
    },
  },
  {
    id: 'DF-01',
    request: {
      ...sectionOnly(
        { designation: 'IPE 330', properties: { Iy: '9504 cm4' } },
        355,
        'en-recommended',
      ),
      loadBasis: 'characteristic',
      spans: ['400 cm'],
      loads: [simple(50)],
      selfWeight: false,
      deflectionLimit: 'span/360',
    },
    values: {
      delta: (answer) => of('deflection', 'w_inst')(answer) / 10,
      'limit_L/360': of('deflection', 'w_lim'),
    },
  },
  {
    id: 'DF-03',
    request: {
      ...sectionOnly(
        { designation: 'IPE 330', properties: { Iy: '11770 cm4' } },
        235,
        'en-recommended',
      ),
      loadBasis: 'characteristic',
      spans: [5.7],
      loads: [simple(9.56), simple(6.25, 'variable')],
      selfWeight: false,
      deflectionLimit: 'span/250',
    },
    values: {
      'w_G+Q': of('deflection', 'w_inst'),
      'span/w_G+Q': (answer) => 5700 / of('deflection', 'w_inst')(answer),
    },
    without: { w_Q: 'a part of the deflection by one action' },
  },
  {
    id: 'EX-01',
    request: {
      ...sectionOnly('UC 254x254x89', 275, 'en-recommended'),
      spans: [4],
      loads: [simple(112.29)],
      selfWeight: false,
    },
    values: {
      M_waler: of('bending-y', 'M_y_Ed'),
      P_A: (answer) => 2 * (answer.reactions?.[0]?.design.persistent?.max ?? NaN),
    },
    without: Object.fromEntries(
      ['Ka', 'A', 'B1', 'C', 'B2', 'P_B', 'P_C'].map((key) => [
        key,
        'earth pressure and other struts',
      ]),
    ),
  },
];
