import type { ProfileTree } from '../tree';
import { recommendedPsi } from './en-recommended';
import { bound, recalled, sourced } from './values';

/** Choices of the UK National Annexes to EN 1990, EN 1993-1-1 and EN 1993-1-5. */
export const ukNa: ProfileTree = {
  combinations: {
    strength: sourced('6.10', 'EN 1990 6.4.3.2', 'MSB03', 'p.3-4/3-5; the conservative expression'),
    gamma_G_sup: sourced(1.35, 'UK NA to EN 1990 Table NA.A1.2(B)', 'PK'),
    gamma_G_inf: sourced(1, 'EN 1990 Table A1.2(B)', 'MSB03', 'p.3-5'),
    gamma_Q: sourced(1.5, 'UK NA to EN 1990 Table NA.A1.2(B)', 'PK'),
    xi: sourced(0.925, 'UK NA to EN 1990 Table NA.A1.2(B)', 'ICE-T2', 'Table 2'),
    accidentalLeading: bound(
      'psi_1',
      'EN 1990 6.4.3.3 (6.11)',
      'The expression leaves psi_1 or psi_2 open; psi_1 is the greater.',
    ),
  },
  psi: {
    ...recommendedPsi,
    wind: {
      psi_0: recalled(0.5, 'UK NA to EN 1990 Table NA.A1.1'),
      psi_1: sourced(
        0.2,
        'EN 1990 Table A1.1',
        'MSB03',
        'p.3-5/3-6, implied by the printed examples',
      ),
      psi_2: sourced(
        0,
        'EN 1990 Table A1.1',
        'MSB03',
        'p.3-5/3-6, implied by the printed examples',
      ),
    },
  },
  steel: {
    gamma_M0: sourced(1, 'UK NA to EN 1993-1-1 NA.2.15', 'BB-UK'),
    gamma_M1: sourced(1, 'UK NA to EN 1993-1-1 NA.2.15', 'BB-UK'),
    gamma_M2: recalled(1.1, 'UK NA to EN 1993-1-1 NA.2.15'),
    eta: recalled(1, 'UK NA to EN 1993-1-5 NA.2.4', 'RB-04: shear area of IPE 450 (SSB04 App. D)'),
    strengths: recalled(
      'product-standards',
      'UK NA to EN 1993-1-1 NA.2.4',
      'CL-03: UBP 356x368x174 in S355, f_y 345 at 20.4 mm (UK NA resistance tables)',
    ),
  },
};
