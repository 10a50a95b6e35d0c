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

/** Toes, back corners, junctions at the end of the root, and the web's centre; web at the left. */
export function channelStresses(shape: ShapeOf<'channel'>, gross: Gross): StressShape {
  const { h, b, t_w, t_f, r } = shape;
  const y_c = gross.y_c ?? 0;
  const web = (z: number): Station => onWeb(shape, gross, z);
  const named = SIDES.flatMap(({ sign, vertical }): NamedStation[] => [
    {
      ...onFlange(shape, gross, sign, b - y_c),
      z: (sign * h) / 2,
      id: `flange-tip-${vertical}`,
      title: `Toe of the ${vertical} flange`,
    },
    {
      ...onFlange(shape, gross, sign, -y_c + t_w / 2),
      y: -y_c,
      z: (sign * h) / 2,
      id: `web-corner-${vertical}`,
      title: `Back of the web at the ${vertical}`,
    },
    {
      ...web(sign * (h / 2 - t_f - r)),
      id: `web-junction-${vertical}`,
      title: `Web at the end of the ${vertical} root`,
    },
  ]);
  const from = -y_c + t_w / 2;
  return {
    named: [...named, { ...web(0), id: 'web-centre', title: 'Centre of the web' }],
    walls: [
      {
        id: 'web',
        title: 'Web',
        t: t_w,
        stations: steps(24).map((part) => web((part - 0.5) * (h - t_f))),
      },
      ...SIDES.map(({ sign, vertical }) => ({
        id: `flange-${vertical}`,
        title: `Flange at the ${vertical}`,
        t: t_f,
        stations: steps(16).map((part) =>
          onFlange(shape, gross, sign, from + part * (b - y_c - from)),
        ),
      })),
    ],
  };
}

/** The part beyond y towards the toe is cut off. */
function onFlange(
  { h, b, t_w, t_f }: ShapeOf<'channel'>,
  gross: Gross,
  sign: number,
  y: number,
): Station {
  const { y_c = 0, e_0 = 0 } = gross;
  const z = (sign * (h - t_f)) / 2;
  const toe = b - y_c;
  const beyond = toe - y;
  const fromWeb = y + y_c - t_w / 2;
  return {
    y,
    z,
    t: t_f,
    S_y: t_f * beyond * z,
    S_z: (t_f * beyond * (toe + y)) / 2,
    torsion: t_f / Math.max(t_w, t_f),
    omega: ((h - t_f) / 2) * Math.abs(fromWeb - e_0),
    warpingShear: true,
  };
}

/**
 * By symmetry the half above or below the middle has no first moment about z-z, so that V_y makes no
 * flow at the web's centre.
 */
function onWeb({ h, t_w, t_f }: ShapeOf<'channel'>, gross: Gross, z: number): Station {
  const { y_c = 0, e_0 = 0, W_pl_y = 0 } = gross;
  const toCentre = t_w * Math.abs(z) * (y_c - t_w / 2);
  return {
    ...plain({
      y: -y_c + t_w / 2,
      z,
      t: t_w,
      S_y: Math.max(W_pl_y / 2 - (t_w * z ** 2) / 2, 0),
      S_z: toCentre,
      torsion: t_w / Math.max(t_w, t_f),
    }),
    omega: Math.min(Math.abs(z), (h - t_f) / 2) * e_0,
    warpingShear: true,
  };
}
