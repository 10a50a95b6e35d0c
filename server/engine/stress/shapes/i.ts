import type { ShapeOf } from '../../sections/shapes/shape';
import {
  plain,
  SIDES,
  steps,
  type Gross,
  type StressShape,
  type Station,
  type NamedStation,
  type Wall,
} from '../station';

/** Flange tips, junctions at the end of the root, flange centres and the web's centre. */
export function iStresses(shape: ShapeOf<'I'>, gross: Gross): StressShape {
  const { h, t_f, r } = shape;
  const web = (z: number): Station => onWeb(shape, gross, z);
  const junctions: NamedStation[] = SIDES.map(({ sign, vertical }) => ({
    ...web(sign * (h / 2 - t_f - r)),
    id: `web-junction-${vertical}`,
    title: `Web at the end of the ${vertical} root`,
  }));
  return {
    named: [
      ...SIDES.flatMap((side) => flangeStations(shape, side)),
      ...junctions,
      { ...web(0), id: 'web-centre', title: 'Centre of the web' },
    ],
    walls: [
      {
        id: 'web',
        title: 'Web',
        t: shape.t_w,
        stations: steps(24).map((part) => web((part - 0.5) * (h - 2 * t_f))),
      },
      ...SIDES.map((side): Wall => ({
        id: `flange-${side.vertical}`,
        title: `Flange at the ${side.vertical}`,
        t: t_f,
        stations: steps(24).map((part) => onFlange(shape, side.sign, (part - 0.5) * shape.b)),
      })),
    ],
  };
}

/** Half of the plastic modulus is the first moment of half of the section, fillets and all. */
function onWeb({ t_w, t_f }: ShapeOf<'I'>, gross: Gross, z: number): Station {
  const S_y = (gross.W_pl_y ?? 0) / 2 - (t_w * z ** 2) / 2;
  return plain({ y: 0, z, t: t_w, S_y, S_z: 0, torsion: t_w / Math.max(t_w, t_f) });
}

/** A place on the middle of a flange; the part beyond it towards the nearer tip is cut off. */
function onFlange({ h, b, t_w, t_f }: ShapeOf<'I'>, sign: number, y: number): Station {
  const z = (sign * (h - t_f)) / 2;
  const side = y < 0 ? -1 : 1;
  const beyond = b / 2 - Math.abs(y);
  return {
    y,
    z,
    t: t_f,
    S_y: t_f * beyond * z,
    S_z: (side * t_f * beyond * (b / 2 + Math.abs(y))) / 2,
    torsion: t_f / Math.max(t_w, t_f),
    omega: (Math.abs(y) * (h - t_f)) / 2,
    warpingShear: Math.abs(y) < b / 4,
  };
}

function flangeStations(
  shape: ShapeOf<'I'>,
  { sign, vertical }: (typeof SIDES)[number],
): NamedStation[] {
  const { h, b } = shape;
  const z = (sign * h) / 2;
  const tips = SIDES.map((side) => ({
    ...onFlange(shape, sign, (side.sign * b) / 2),
    z,
    id: `flange-tip-${vertical}-${side.horizontal}`,
    title: `Tip of the ${vertical} flange, ${side.horizontal}`,
  }));
  // Left and right of the web the flows of V_z part; the side where both shears add is the worse.
  const centres = SIDES.map((side) => ({
    ...onFlange(shape, sign, side.sign * 1e-9),
    y: 0,
    z,
    id: `flange-centre-${vertical}`,
    title: `Centre of the ${vertical} flange`,
  }));
  return [...tips, ...centres];
}
