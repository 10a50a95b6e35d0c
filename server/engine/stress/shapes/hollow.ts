import type { ShapeOf } from '../../sections/shapes/shape';
import {
  plain,
  SIDES,
  steps,
  type Gross,
  type NamedStation,
  type Station,
  type StressShape,
} from '../station';

/**
 * Corners and the middles of the walls. The flow runs clockwise as drawn: down on the right, up on
 * the left; V_z has none at the middles of top and bottom, V_y none at those of the sides.
 */
export function rhsStresses(shape: ShapeOf<'RHS'>, gross: Gross): StressShape {
  const { h, b, t } = shape;
  const corners = SIDES.flatMap((v) =>
    SIDES.map((w): NamedStation => ({
      ...onSide(shape, gross, w.sign, (v.sign * (h - t)) / 2),
      y: (w.sign * b) / 2,
      z: (v.sign * h) / 2,
      id: `corner-${v.vertical}-${w.horizontal}`,
      title: `Corner at the ${v.vertical}, ${w.horizontal}`,
    })),
  );
  const middles = SIDES.flatMap(({ sign, vertical, horizontal }): NamedStation[] => [
    {
      ...onSide(shape, gross, sign, 0),
      y: (sign * b) / 2,
      id: `mid-wall-${horizontal}`,
      title: `Middle of the ${horizontal} wall`,
    },
    {
      ...onFlat(shape, gross, sign, 0),
      z: (sign * h) / 2,
      id: `mid-wall-${vertical}`,
      title: `Middle of the ${vertical} wall`,
    },
  ]);
  return {
    named: [...corners, ...middles],
    walls: SIDES.flatMap(({ sign, vertical, horizontal }) => [
      {
        id: `wall-${horizontal}`,
        title: `Wall at the ${horizontal}`,
        t,
        stations: steps(20).map((part) => onSide(shape, gross, sign, (part - 0.5) * (h - t))),
      },
      {
        id: `wall-${vertical}`,
        title: `Wall at the ${vertical}`,
        t,
        stations: steps(20).map((part) => onFlat(shape, gross, sign, (part - 0.5) * (b - t))),
      },
    ]),
  };
}

/** A quarter of the plastic modulus is the first moment of a quarter of the section. */
function onSide({ b, t }: ShapeOf<'RHS'>, gross: Gross, sign: number, z: number): Station {
  const y = (sign * (b - t)) / 2;
  return plain({
    y,
    z,
    t,
    S_y: sign * Math.max((gross.W_pl_y ?? 0) / 4 - (t * z ** 2) / 2, 0),
    S_z: -(t * z * (b - t)) / 2,
    torsion: 1,
  });
}

function onFlat({ h, t }: ShapeOf<'RHS'>, gross: Gross, sign: number, y: number): Station {
  const z = (sign * (h - t)) / 2;
  return plain({
    y,
    z,
    t,
    S_y: (t * y * (h - t)) / 2,
    S_z: -sign * Math.max((gross.W_pl_z ?? 0) / 4 - (t * y ** 2) / 2, 0),
    torsion: 1,
  });
}

/** Eight points, 45 degrees apart, clockwise from the right. */
export function chsStresses({ d, t }: ShapeOf<'CHS'>, gross: Gross): StressShape {
  const at = (angle: number, radius: number): Station => {
    const quarter = (gross.W_pl_y ?? 0) / 4;
    return plain({
      y: radius * Math.cos(angle),
      z: radius * Math.sin(angle),
      t,
      S_y: quarter * Math.cos(angle),
      S_z: -quarter * Math.sin(angle),
      torsion: 1,
    });
  };
  return {
    named: eighths.map(({ id, title }, index) => ({
      ...cleaned(at((index * Math.PI) / 4, d / 2)),
      id,
      title,
    })),
    walls: [
      {
        id: 'wall',
        title: 'Wall, clockwise from the right',
        t,
        stations: steps(48).map((part) => at(part * 2 * Math.PI, (d - t) / 2)),
      },
    ],
  };
}

/** What floating point leaves of a zero, at a diameter of at most 5 m. */
const DUST = 1e-9;

function cleaned(station: Station): Station {
  const clean = (value: number): number => (Math.abs(value) < DUST ? 0 : value);
  return { ...station, y: clean(station.y), z: clean(station.z) };
}

export const eighths = [
  { id: 'right', title: 'Right' },
  { id: 'bottom-right', title: 'Bottom right' },
  { id: 'bottom', title: 'Bottom' },
  { id: 'bottom-left', title: 'Bottom left' },
  { id: 'left', title: 'Left' },
  { id: 'top-left', title: 'Top left' },
  { id: 'top', title: 'Top' },
  { id: 'top-right', title: 'Top right' },
] as const;
