import type { ShapeOf } from '../../sections/shapes/shape';
import { plain, SIDES, steps, type NamedStation, type Station, type StressShape } from '../station';
import { eighths } from './hollow';

/**
 * Corners, middles of the sides and the centre. A solid has no wall: S over the width it is cut by
 * gives the stress along each axis, so that S_y is for t = b and S_z is scaled to it.
 */
export function rectangleStresses({ h, b }: ShapeOf<'rectangle'>): StressShape {
  const at = (y: number, z: number): Station =>
    plain({
      y,
      z,
      t: b,
      S_y: (b / 2) * (h ** 2 / 4 - z ** 2),
      S_z: (b / 2) * (b ** 2 / 4 - y ** 2),
      torsion: onSides(Math.abs((2 * y) / b), Math.abs((2 * z) / h)),
    });
  const corners = SIDES.flatMap((v) =>
    SIDES.map((w): NamedStation => ({
      ...at((w.sign * b) / 2, (v.sign * h) / 2),
      id: `corner-${v.vertical}-${w.horizontal}`,
      title: `Corner at the ${v.vertical}, ${w.horizontal}`,
    })),
  );
  const middles = SIDES.flatMap(({ sign, vertical, horizontal }): NamedStation[] => [
    {
      ...at(0, (sign * h) / 2),
      id: `mid-side-${vertical}`,
      title: `Middle of the ${vertical} side`,
    },
    {
      ...at((sign * b) / 2, 0),
      id: `mid-side-${horizontal}`,
      title: `Middle of the ${horizontal} side`,
    },
  ]);
  return {
    named: [...corners, ...middles, { ...at(0, 0), id: 'centre', title: 'Centre' }],
    walls: axes(at, b, h),
  };
}

/** Eight points of the edge and the centre; 4/3 V/A all along the diameter across the force. */
export function roundStresses({ d }: ShapeOf<'round'>): StressShape {
  const at = (y: number, z: number): Station => {
    return plain({
      y,
      z,
      t: d,
      S_y: (d / 3) * (d ** 2 / 4 - z ** 2),
      S_z: (d / 3) * (d ** 2 / 4 - y ** 2),
      torsion: (2 * Math.hypot(y, z)) / d,
    });
  };
  return {
    named: [
      ...eighths.map(({ id, title }, index): NamedStation => {
        const angle = (index * Math.PI) / 4;
        const onEdge = (part: number): number => (Math.abs(part) < 1e-12 ? 0 : (part * d) / 2);
        return { ...at(onEdge(Math.cos(angle)), onEdge(Math.sin(angle))), id, title };
      }),
      { ...at(0, 0), id: 'centre', title: 'Centre' },
    ],
    walls: axes(at, d, d),
  };
}

/** None in the centre and in the corners, all of it in the middle of a side: the safe end elsewhere. */
function onSides(y: number, z: number): number {
  return Math.max(y, z) * (1 - Math.min(y, z));
}

function axes(at: (y: number, z: number) => Station, b: number, h: number) {
  return [
    {
      id: 'depth',
      title: 'Over the depth',
      t: b,
      stations: steps(24).map((part) => at(0, (part - 0.5) * h)),
    },
    {
      id: 'width',
      title: 'Over the width',
      t: h,
      stations: steps(24).map((part) => at((part - 0.5) * b, 0)),
    },
  ];
}
