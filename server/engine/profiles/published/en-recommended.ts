import type { ProfileTree } from '../tree';
import { bound, recalled, sourced, unreduced } from './values';

const psiTable = 'EN 1990 Table A1.1';
const strengthTable = 'EN 1990 Table A1.2(B)';
const execution = 'EN 1991-1-6 Annex A1 (A1.1)';

/** psi as recommended; `imposed-a` to `-d`, `storage`, `vehicles` are EN 1991-1-1's categories A to G. */
export const recommendedPsi: ProfileTree = {
  wind: {
    psi_0: sourced(0.6, psiTable, 'MSB03', 'p.3-5/3-6, implied by the printed examples'),
    psi_1: sourced(0.2, psiTable, 'MSB03', 'p.3-5/3-6, implied by the printed examples'),
    psi_2: sourced(0, psiTable, 'MSB03', 'p.3-5/3-6, implied by the printed examples'),
  },
  snow: {
    psi_0: sourced(0.5, psiTable, 'MSB03', 'p.3-5/3-6, implied; up to 1000 m'),
    psi_1: sourced(0.2, psiTable, 'MSB03', 'p.3-5/3-6, implied; up to 1000 m'),
    psi_2: sourced(0, psiTable, 'MSB03', 'p.3-5/3-6, implied; up to 1000 m'),
  },
  'imposed-a': {
    psi_0: recalled(0.7, psiTable),
    psi_1: recalled(0.5, psiTable),
    psi_2: recalled(0.3, psiTable),
  },
  'imposed-b': {
    psi_0: sourced(0.7, psiTable, 'MSB03', 'p.3-6, implied'),
    psi_1: recalled(0.5, psiTable),
    psi_2: sourced(0.3, psiTable, 'MSB03', 'p.3-6, implied'),
  },
  'imposed-c': {
    psi_0: recalled(0.7, psiTable),
    psi_1: recalled(0.7, psiTable),
    psi_2: recalled(0.6, psiTable),
  },
  'imposed-d': {
    psi_0: recalled(0.7, psiTable),
    psi_1: recalled(0.7, psiTable),
    psi_2: recalled(0.6, psiTable),
  },
  storage: {
    psi_0: bound(1, psiTable, 'Recommended value, from memory, and the greatest that psi can be.'),
    psi_1: recalled(0.9, psiTable),
    psi_2: recalled(0.8, psiTable),
  },
  'vehicles-light': {
    psi_0: recalled(0.7, psiTable),
    psi_1: recalled(0.7, psiTable),
    psi_2: recalled(0.6, psiTable),
  },
  'vehicles-heavy': {
    psi_0: recalled(0.7, psiTable),
    psi_1: recalled(0.5, psiTable),
    psi_2: recalled(0.3, psiTable),
  },
  temperature: {
    psi_0: recalled(0.6, psiTable),
    psi_1: recalled(0.5, psiTable),
    psi_2: recalled(0, psiTable),
  },
  construction: {
    psi_0: bound(1, execution, 'Recommended value, from memory, and the greatest that psi can be.'),
    psi_1: bound(1, execution, 'Not used there; no reduction is taken.'),
    psi_2: recalled(0.2, execution),
  },
  surcharge: unreduced,
  water: unreduced,
  earth: unreduced,
};

/** The recommended values of EN 1990, EN 1991-1-6, EN 1993-1-1 and EN 1993-1-5. */
export const enRecommended: ProfileTree = {
  combinations: {
    strength: sourced('6.10', 'EN 1990 6.4.3.2', 'MSB03', 'p.3-4/3-5; the conservative expression'),
    gamma_G_sup: sourced(1.35, strengthTable, 'MSB03', 'p.3-5'),
    gamma_G_inf: sourced(1, strengthTable, 'MSB03', 'p.3-5'),
    gamma_Q: sourced(1.5, strengthTable, 'MSB03', 'p.3-5'),
    xi: sourced(0.85, strengthTable, 'MSB03', 'p.3-5'),
    accidentalLeading: bound(
      'psi_1',
      'EN 1990 6.4.3.3 (6.11)',
      'The expression leaves psi_1 or psi_2 open; psi_1 is the greater.',
    ),
  },
  psi: recommendedPsi,
  steel: {
    gamma_M0: sourced(1, 'EN 1993-1-1 6.1(1)', 'MSB10', 'MSB10/15'),
    gamma_M1: sourced(1, 'EN 1993-1-1 6.1(1)', 'MSB10', 'MSB10/15'),
    gamma_M2: recalled(1.25, 'EN 1993-1-1 6.1(1)'),
    eta: sourced(1.2, 'EN 1993-1-5 5.1', 'MSB10', 'MSB10/15'),
    strengths: recalled(
      'table-3.1',
      'EN 1993-1-1 3.2.1(1)',
      'CO-01: HE 300 B in S235, f_y 235 at 19 mm (MSB04 App. A.5)',
    ),
  },
};
