import type { CheckAnswer, Verification } from '../src/contract';

/** A verification with its utilisation; over 1 it fails. */
export function verification(id: Verification['id'], utilisation: number): Verification {
  return {
    id,
    title: id === 'bending-y' ? 'Bending about y-y' : id,
    clause: 'EN 1993-1-1 6.2.5(1) (6.12)',
    effect: { symbol: 'M_y_Ed', value: 100 * utilisation, unit: 'kN m' },
    resistance: { symbol: 'M_c_y_Rd', value: 100, unit: 'kN m' },
    utilisation,
    status: utilisation <= 1 ? 'pass' : 'fail',
    combination: 'C2',
    at: { span: 1, x: 3, support: 2 },
    values: {},
  };
}

/** An answer about a waler of two spans of 3 m, with its figures. */
export function answerOf(change: Partial<CheckAnswer> = {}): CheckAnswer {
  return {
    check: 'waler',
    status: 'pass',
    utilisation: 0.87,
    governing: 'bending-y',
    missing: [],
    waived: [],
    notCovered: ['connections and splices'],
    verifications: [verification('shear-z', 0.4), verification('bending-y', 0.87)],
    values: {},
    steps: [
      {
        kind: 'formula',
        formula: 'M_c_y_Rd-1',
        verification: 'bending-y',
        symbol: 'M_c_y_Rd',
        title: 'Bending resistance about y-y',
        substituted: '(1224000 mm^3) * (265 N/mm^2) / 1',
        value: 324.36,
        unit: 'kN m',
        clause: 'EN 1993-1-1 6.2.5(2) (6.13)',
        inputs: {
          W_pl_y: { value: 1224000, unit: 'mm^3' },
          f_y: { value: 265, unit: 'N/mm^2' },
          gamma_M0: { value: 1, unit: '1' },
        },
      },
    ],
    combinations: [
      {
        id: 'C2',
        situation: 'persistent',
        expression: 'EN 1990 (6.10)',
        leading: 'surcharge',
        factors: { earth: 1.35, surcharge: 1.5 },
        kMod: null,
        pattern: 'all',
        lostSupport: null,
        lifted: [],
      },
    ],
    reactions: [
      {
        support: 1,
        x: 0,
        byAction: [{ name: 'earth', nature: 'permanent', min: 112.26, max: 112.26 }],
        design: { persistent: { min: 107.5, max: 195.3, combination: 'C2' }, accidental: null },
        serviceability: { min: 109, max: 141.5 },
      },
    ],
    diagrams: {
      moment: [
        { span: 1, x: 0, min: 0, max: 0 },
        { span: 1, x: 1.2, min: 40.1, max: 84.2 },
        { span: 1, x: 3, min: -118.6, max: -60 },
        { span: 2, x: 3, min: -118.6, max: -60 },
        { span: 2, x: 6, min: 0, max: 0 },
      ],
      shear: [{ span: 1, x: 0, min: 90, max: 195.3 }],
      deflection: [],
    },
    profile: {
      slug: 'uk-na',
      revision: 2,
      title: 'United Kingdom',
      status: 'approved',
      standing: 'in-effect',
      sha256: 'f'.repeat(64),
      departures: [],
      unconfirmed: [],
    },
    advisories: [],
    basis: { standards: ['EN 1993-1-1:2005+A1:2014'], engine: '1.0.0' },
    record: null,
    notice: 'For competent persons.',
    ...change,
  };
}
