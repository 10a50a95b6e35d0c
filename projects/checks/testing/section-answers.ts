import type { CheckAnswer, SectionSketch, StressPoint, StressWall } from '../src/contract';
import { answeredSection, type SectionModel } from '../src/section-drawing/section-model';
import { answerOf, verification } from './answers';

const point = (
  id: string,
  title: string,
  y: number,
  z: number,
  sigma: number,
  tau: number,
): StressPoint => ({ id, title, y, z, sigma, tau, sigma_v: Math.hypot(sigma, Math.sqrt(3) * tau) });

type Ends = readonly [y: number, z: number, sigma: number, tau: number];

const wall = (id: string, title: string, t: number, ...ends: readonly Ends[]): StressWall => ({
  id,
  title,
  t,
  points: ends.map(([y, z, sigma, tau]) => ({ y, z, sigma, tau })),
});

/** UB 457x191x67 under compression, bending and shear: the numbers are about right, no more. */
export function sectionAnswerOf(change: Partial<CheckAnswer> = {}): CheckAnswer {
  const made = { combination: null, at: null };
  return answerOf({
    check: 'section',
    utilisation: 0.79,
    governing: 'bending-axial-y',
    notCovered: ['buckling of the member'],
    verifications: [
      {
        ...verification('bending-axial-y', 0.79),
        ...made,
        title: 'Bending about y-y with axial force',
      },
      { ...verification('shear-z', 0.5), ...made, title: 'Shear along z-z' },
    ],
    combinations: [],
    reactions: [],
    diagrams: { moment: [], shear: [], deflection: [] },
    section: {
      name: 'UB 457x191x67',
      shape: 'I',
      dimensions: { h: 453.4, b: 189.9, tw: 8.5, tf: 12.7, r: 10.2 },
      ineffective: [{ under: 'N', y: 0, z: 0, width: 8.5, height: 96 }],
    },
    points: [
      point('flange-tip-top-left', 'flange tip, top left', -95, -226.7, -168.2, 0),
      point('flange-tip-top-right', 'flange tip, top right', 95, -226.7, -168.2, 0),
      point('flange-centre-top', 'flange centre, top', 0, -220.4, -164.3, 18),
      point('junction-top', 'flange-web junction, top', 0, -203.8, -154.2, 70.4),
      point('web-centre', 'web centre', 0, 0, -29.2, 86.1),
      point('junction-bottom', 'flange-web junction, bottom', 0, 203.8, 95.7, 70.4),
      point('flange-tip-bottom-right', 'flange tip, bottom right', 95, 226.7, 109.7, 0),
    ],
    walls: [
      wall(
        'flange-top',
        'top flange',
        12.7,
        [-95, -220.4, -164.3, 0],
        [0, -220.4, -164.3, 18],
        [95, -220.4, -164.3, 0],
      ),
      wall('web', 'web', 8.5, [0, -214, -160.4, 68], [0, 0, -29.2, 86.1], [0, 214, 101.9, 68]),
      wall(
        'flange-bottom',
        'bottom flange',
        12.7,
        [-95, 220.4, 105.9, 0],
        [0, 220.4, 105.9, 18],
        [95, 220.4, 105.9, 0],
      ),
    ],
    interaction: [
      {
        verification: 'bending-axial-y',
        x: { symbol: 'M_y_Ed', unit: 'kN m' },
        y: { symbol: 'N_Ed', unit: 'kN' },
        curve: [
          { x: 0, y: 2351 },
          { x: 150, y: 1640 },
          { x: 324, y: 760 },
          { x: 404.5, y: 370 },
          { x: 404.5, y: 0 },
        ],
        point: { x: 180, y: 250 },
      },
    ],
    ...change,
  });
}

/** Two states of stress, the second of which governs. */
export function statesAnswerOf(change: Partial<CheckAnswer> = {}): CheckAnswer {
  const rest = sectionAnswerOf();
  delete (rest as { section?: unknown }).section;
  delete (rest as { walls?: unknown }).walls;
  delete (rest as { interaction?: unknown }).interaction;
  return {
    ...rest,
    check: 'stress',
    utilisation: 0.97,
    governing: 'von-mises',
    verifications: [
      {
        ...verification('von-mises', 0.97),
        combination: null,
        at: null,
        title: 'Von Mises’ criterion',
        point: 'state-2',
      },
    ],
    points: [
      { ...point('state-1', 'state 1', 0, 0, 100, 20), y: null, z: null, sigmaZ: 0 },
      { ...point('state-2', 'state 2', 0, 0, 180, 65), y: null, z: null, sigmaZ: -40 },
    ],
    ...change,
  };
}

/** The section of an answer as it is drawn. */
export function modelOf(sketch: SectionSketch | undefined): SectionModel {
  const model = sketch ? answeredSection(sketch) : null;
  if (!model) throw new Error('The answer has no section that can be drawn.');
  return model;
}
