import type { WalerRequest } from '../../server/engine/checks/contract';
import { of, top, type Pick, type PublishedCase } from './published-case';

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

/** What the first support carries of one action. */
const reaction =
  (name: string): Pick =>
  ({ reactions = [] }) =>
    reactions[0]?.byAction.find((one) => one.name === name)?.max ?? NaN;

const support =
  (index: number, per = 1): Pick =>
  ({ reactions = [] }) =>
    (reactions[index]?.design.persistent?.max ?? NaN) / per;

const OTHER_CHECK = 'for the member check';

export const walerCases: readonly PublishedCase[] = [
  {
    id: 'SP-01',
    check: 'waler',
    request: sectionOnly('HE 300 B', 235, 'en-recommended'),
    values: { A: top('A', 1e2), Iy: top('I_y', 1e4), Iz: top('I_z', 1e4) },
    rounded: {
      Iy: 'printed to four figures',
      Iz: 'printed to three figures',
    },
  },
  {
    id: 'SP-02',
    check: 'waler',
    request: sectionOnly('IPE 330', 235, 'en-recommended'),
    values: {
      'Wpl,y': top('W_pl_y', 1e3),
      Iz: top('I_z', 1e4),
      It: top('I_t', 1e4),
      Iw: top('I_w', 1e6),
    },
    rounded: { Iw: 'printed to four figures' },
  },
  {
    id: 'CL-01',
    check: 'waler',
    request: sectionOnly('IPE 330', 235, 'en-recommended'),
    values: {
      eps: top('epsilon'),
      'c/tf': top('c_f_t_f'),
      'c/tw': top('c_w_t_w'),
      class: top('section_class'),
    },
  },
  {
    id: 'CL-03',
    check: 'waler',
    request: sectionOnly('UBP 356x368x174', 345, 'uk-na'),
    values: {
      class: top('section_class'),
      'Mc,y,Rd': of('bending-y', 'M_c_y_Rd'),
      'Mc,z,Rd': of('bending-z', 'M_c_z_Rd'),
      'fyWel,y': (answer) => ((answer.values.W_el_y?.value ?? NaN) * 345) / 1e6,
      'fyWel,z': (answer) => ((answer.values.W_el_z?.value ?? NaN) * 345) / 1e6,
    },
  },
  {
    id: 'CL-06',
    check: 'waler',
    request: sectionOnly('HEB 160', 275, 'en-recommended'),
    values: { eps: top('epsilon'), 'd/tw': top('c_w_t_w'), 'c/tf': top('c_f_t_f') },
  },
  {
    id: 'RB-01',
    check: 'waler',
    request: {
      profile: 'en-recommended',
      section: 'IPE 330',
      material: { type: 'steel', grade: 'S235' },
      loadBasis: 'characteristic',
      spans: [5.7],
      // The beam's own weight, and slab, finishes and imposed load on 2.5 m.
      loads: [
        simple(0.482),
        { name: 'permanent', nature: 'permanent', kind: 'area', value: 2.88, width: 2.5 },
        { name: 'permanent', nature: 'permanent', kind: 'area', value: 0.75, width: 2.5 },
        {
          name: 'imposed',
          nature: 'variable',
          category: 'imposed-b',
          kind: 'area',
          value: 2.5,
          width: 2.5,
        },
      ],
      selfWeight: false,
    },
    values: {
      gk: (answer) => (reaction('permanent')(answer) * 2) / 5.7,
      qk: (answer) => (reaction('imposed')(answer) * 2) / 5.7,
      w_Ed: (answer) => (of('shear-z', 'V_z_Ed')(answer) * 2) / 5.7,
      'My,Ed': of('bending-y', 'M_y_Ed'),
      VEd: of('shear-z', 'V_z_Ed'),
    },
    rounded: {
      'My,Ed': 'the source goes on with w_Ed rounded to 22.28 kN/m',
      VEd: 'the source goes on with w_Ed rounded to 22.28 kN/m',
    },
  },
  {
    id: 'RB-03',
    check: 'waler',
    given: 'Wply',
    request: sectionOnly(
      { designation: 'IPE 450', properties: { Wply: 1702000 } },
      355,
      'en-recommended',
    ),
    values: { 'Mpl,y,Rd': of('bending-y', 'M_c_y_Rd') },
  },
  {
    id: 'RB-04',
    check: 'waler',
    given: 'A',
    request: sectionOnly({ designation: 'IPE 450', properties: { A: 9880 } }, 355, 'uk-na'),
    values: {
      Av: of('shear-z', 'A_v_z'),
      'Vpl,Rd': of('shear-z', 'V_pl_z_Rd'),
      '0.5Vpl,Rd': (answer) => 0.5 * of('shear-z', 'V_pl_z_Rd')(answer),
    },
  },
  {
    id: 'RB-07',
    check: 'waler',
    given: 'A_v',
    request: sectionOnly(
      { designation: 'IPE 330', properties: { Avy: 3680 } },
      355,
      'en-recommended',
    ),
    values: { 'Vpl,Rd': of('shear-y', 'V_pl_y_Rd') },
  },
  {
    id: 'LT-07',
    check: 'waler',
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
    check: 'waler',
    given: 'Iy',
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
    check: 'waler',
    given: 'Iy',
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
  },
  {
    id: 'DF-03',
    check: 'waler',
    given: 'Iy',
    request: {
      ...sectionOnly(
        { designation: 'IPE 330', properties: { Iy: '11770 cm4' } },
        235,
        'en-recommended',
      ),
      loadBasis: 'characteristic',
      spans: [5.7],
      loads: [simple(6.25, 'variable')],
      selfWeight: false,
      deflectionLimit: 'span/250',
    },
    values: { w_Q: of('deflection', 'w_inst') },
  },
  {
    id: 'EX-01',
    check: 'waler',
    request: {
      ...sectionOnly('UC 254x254x89', 275, 'en-recommended'),
      spans: [4],
      loads: [simple(112.29)],
      selfWeight: false,
    },
    values: {
      M_waler: of('bending-y', 'M_y_Ed'),
      P_A: support(0, 0.5),
    },
    without: { Ka: 'earth pressure', P_B: 'the sum of B1 and B2 of two spans, times the spacing' },
  },
  {
    id: 'EX-01',
    check: 'waler',
    // The wall above the middle strut, a metre of it, on the two upper struts.
    request: {
      ...sectionOnly('UC 254x254x89', 275, 'en-recommended'),
      spans: [3],
      overhangs: { start: 2 },
      loads: [simple(26.95)],
      selfWeight: false,
    },
    values: { A: support(0), B1: support(1) },
  },
  {
    id: 'EX-01',
    check: 'waler',
    // The wall below it.
    request: {
      ...sectionOnly('UC 254x254x89', 275, 'en-recommended'),
      spans: [3],
      overhangs: { end: 1 },
      loads: [simple(26.95)],
      selfWeight: false,
    },
    values: { B2: support(0), C: support(1), P_C: support(1, 1 / 4) },
    rounded: { P_C: 'the source goes on with C rounded to 71.87 kN/m' },
  },
  {
    id: 'EX-04',
    check: 'waler',
    given: 'a section, which the example is still to find',
    request: {
      ...sectionOnly('UC 254x254x89', 275, 'en-recommended'),
      spans: [3],
      loads: [simple(45.2 + 45.2)],
      selfWeight: false,
    },
    values: { M_waler: of('bending-y', 'M_y_Ed') },
    without: { S_required: 'a section by an allowable stress' },
  },
];
