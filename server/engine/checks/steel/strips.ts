import { silentSheet } from '../../formula/sheet';
import type { CheckAnswer } from '../contract';
import { epsilonFactor } from '../../steel/classification';
import { isPlated, platesOf } from './classes';
import { lostInBending, lostOf } from './effective';
import type { SteelSection } from './section';

/** A strip of a plate that does not count, mm from the centroid of the gross section, z down. */
export type Strip = NonNullable<CheckAnswer['section']>['ineffective'][number];

type Plated = Extract<SteelSection['shape'], { shape: 'I' | 'channel' | 'RHS' }>;

/** Ends of both axes that a drawing may mirror a strip to. */
const BOTH = [-1, 1] as const;

/**
 * What class 4 leaves out.
 *
 * @param sign of the moment: positive stretches z > 0 or y > 0, so that the other side is compressed
 */
export function ineffectiveStrips(
  section: SteelSection,
  under: Strip['under'],
  sign: number,
): Strip[] {
  const { shape } = section;
  if (!isPlated(shape)) return [];
  const strips =
    under === 'N'
      ? compressed(section, shape)
      : under === 'My' || shape.shape === 'RHS'
        ? bent(section, shape, under === 'My' ? 'y' : 'z', -sign)
        : toes(section, shape, -sign);
  return strips
    .filter(({ width, height }) => width > 0 && height > 0)
    .map((strip) => ({ ...strip, under }));
}

type Drawn = Omit<Strip, 'under'>;

function compressed(section: SteelSection, shape: Plated): Drawn[] {
  const epsilon = epsilonFactor.compute({ f_y: section.f_y });
  const { flange, web } = platesOf(shape, 'y', silentSheet);
  const inFlange = lostOf(flange, 'f', 1, 1, epsilon, silentSheet).length;
  const inWeb = lostOf(web, 'w', 1, 1, epsilon, silentSheet).length;
  return [
    ...BOTH.flatMap((side) => flangeStrips(section, shape, side, inFlange)),
    ...websAt(section, shape).map((y) => ({ y, z: 0, width: web.t, height: inWeb })),
  ];
}

/** y of the middle of each web. */
function websAt({ gross }: SteelSection, shape: Plated): number[] {
  if (shape.shape === 'RHS') return BOTH.map((side) => (side * (shape.b - shape.t)) / 2);
  return [shape.shape === 'I' ? 0 : -(gross.y_c ?? 0) + shape.t_w / 2];
}

/** Of the flange above (-1) or below (1): from its tips, or from its middle between two webs. */
function flangeStrips(
  { gross }: SteelSection,
  shape: Plated,
  side: number,
  length: number,
): Drawn[] {
  const t = shape.shape === 'RHS' ? shape.t : shape.t_f;
  const z = (side * (shape.h - t)) / 2;
  if (shape.shape === 'RHS') return [{ y: 0, z, width: length, height: t }];
  if (shape.shape === 'channel') {
    return [{ y: shape.b - (gross.y_c ?? 0) - length / 2, z, width: length, height: t }];
  }
  return BOTH.map((end) => ({ y: (end * (shape.b - length)) / 2, z, width: length, height: t }));
}

/** @param side which side is compressed, -1 above or left */
function bent(section: SteelSection, shape: Plated, axis: 'y' | 'z', side: number): Drawn[] {
  const { flange, web, A_lost_f, l_w, z_w } = lostInBending(section, axis, silentSheet);
  const length = A_lost_f / (flange.t * (flange.count / 2));
  const at = side * z_w;
  if (axis === 'z' && shape.shape === 'RHS') {
    const { h, b, t } = shape;
    return [
      { y: (side * (b - t)) / 2, z: 0, width: t, height: length },
      ...BOTH.map((end) => ({ y: at, z: (end * (h - t)) / 2, width: l_w, height: t })),
    ];
  }
  return [
    ...flangeStrips(section, shape, side, length),
    ...websAt(section, shape).map((y) => ({ y, z: at, width: web.t, height: l_w })),
  ];
}

/** About z-z: the compressed toes of both flanges, or the compressed web of a channel. */
function toes(section: SteelSection, shape: Plated, side: number): Drawn[] {
  const epsilon = epsilonFactor.compute({ f_y: section.f_y });
  const { flange, web } = platesOf(shape, 'z', silentSheet);
  if (shape.shape === 'channel' && side < 0) {
    const height = lostOf(web, 'w', 1, 1, epsilon, silentSheet).length;
    return websAt(section, shape).map((y) => ({ y, z: 0, width: web.t, height }));
  }
  const { length } = lostOf(flange, 'f', 1, 1, epsilon, silentSheet);
  return BOTH.flatMap((end) =>
    flangeStrips(section, shape, end, length).filter(({ y }) => y * side > 0),
  );
}
