import type { FlangeTaper } from './shape';

/** What bounds the flanges at one side of the web: y runs from the web's face to the toe. */
export interface TaperedFlange {
  readonly h: number;
  readonly t_f: number;
  readonly r: number;
  readonly taper: FlangeTaper;
  readonly from: number;
  readonly toe: number;
}

/** A part of both flanges between two values of y, whose inner face is one line or one arc. */
export interface Strip {
  readonly from: number;
  readonly to: number;
  /** Both flanges' material at y, together. */
  thickness(y: number): number;
  /** A function of y integrated over the strip. */
  integral(of: (y: number) => number): number;
  /** What of the strip stands beyond y: nothing or one strip. */
  beyond(y: number): Strip[];
}

export type Strips = readonly Strip[];

/** ∫ of(y, t) dy, where t is the material of both flanges at y. */
export function integral(strips: Strips, of: (y: number, t: number) => number): number {
  return strips.reduce((sum, strip) => sum + strip.integral((y) => of(y, strip.thickness(y))), 0);
}

/** Root arc, sloped face and toe arc; the arcs touch the sloped face. */
export function flangeStrips(flange: TaperedFlange): Strips {
  const { h, t_f, r, taper, from, toe } = flange;
  const { slope, at, r_2 } = taper;
  const tilt = Math.atan(slope);
  /** Depth of the sloped face below the flange's outer face. */
  const depth = (y: number): number => t_f + slope * (toe - at - y);
  const root = { y: from + r, depth: depth(from + r) + r / Math.cos(tilt) };
  const end = { y: toe - r_2, depth: depth(toe - r_2) - r_2 / Math.cos(tilt) };
  const touches = {
    root: root.y - r * Math.sin(tilt),
    toe: end.y + r_2 * Math.sin(tilt),
  };
  const both = (inner: (y: number) => number) => (y: number) => Math.min(2 * inner(y), h);
  const chord = (radius: number, offset: number): number =>
    Math.sqrt(Math.max(0, radius ** 2 - offset ** 2));
  return [
    arc(
      root.y,
      r,
      from,
      touches.root,
      both((y) => root.depth - chord(r, y - root.y)),
    ),
    line(touches.root, touches.toe, both(depth)),
    arc(
      end.y,
      r_2,
      touches.toe,
      toe,
      both((y) => end.depth + chord(r_2, y - end.y)),
    ),
  ].flat();
}

/** Plastic modulus of a channel about z-z in mm³: static moment about the axis that halves the area. */
export function plasticModulusZ(
  h: number,
  t_w: number,
  flanges: Strips,
  A: number,
  y_c: number,
): number {
  if (h * t_w >= A / 2) {
    const inWeb = A / (2 * h);
    return A * y_c - A * inWeb + h * inWeb ** 2;
  }
  const axis = halvingAxis(flanges, A, t_w);
  const beyond = flanges.flatMap((strip) => strip.beyond(axis));
  return 2 * integral(beyond, (y, t) => t * (y - axis)) - A * (y_c - axis);
}

/** Newton from the web outwards: the flanges thin towards the toes, so it never overshoots. */
function halvingAxis(flanges: Strips, A: number, from: number): number {
  let axis = from;
  for (let step = 0; step < 30; step += 1) {
    const beyond = flanges.flatMap((strip) => strip.beyond(axis));
    const here = beyond[0]?.thickness(axis) ?? NaN;
    const next = axis + (integral(beyond, (_, t) => t) - A / 2) / here;
    if (Math.abs(next - axis) < 1e-9) return next;
    axis = next;
  }
  return axis;
}

type Thickness = (y: number) => number;

function line(from: number, to: number, thickness: Thickness): Strip[] {
  if (to <= from) return [];
  const half = (to - from) / 2;
  return [
    {
      from,
      to,
      thickness,
      integral: (of) => quadrature((x) => of(from + half * (1 + x)) * half),
      beyond: (y) => line(Math.max(from, y), to, thickness),
    },
  ];
}

/** Over the angle of the arc the integrand is smooth; over y it is not, at the tangent. */
function arc(
  centre: number,
  radius: number,
  from: number,
  to: number,
  thickness: Thickness,
): Strip[] {
  if (to <= from) return [];
  const angle = (y: number): number => Math.asin(Math.min(1, Math.max(-1, (y - centre) / radius)));
  const [start, half] = [angle(from), (angle(to) - angle(from)) / 2];
  return [
    {
      from,
      to,
      thickness,
      integral: (of) =>
        quadrature((x) => {
          const turn = start + half * (1 + x);
          return of(centre + radius * Math.sin(turn)) * radius * Math.cos(turn) * half;
        }),
      beyond: (y) => arc(centre, radius, Math.max(from, y), to, thickness),
    },
  ];
}

/** Gauss-Legendre with ten points, exact for polynomials of degree 19. */
const points: readonly (readonly [x: number, weight: number])[] = [
  [0.14887433898163122, 0.29552422471475287],
  [0.4333953941292472, 0.26926671930999635],
  [0.6794095682990244, 0.21908636251598204],
  [0.8650633666889845, 0.1494513491505806],
  [0.9739065285171717, 0.06667134430868814],
];

function quadrature(of: (x: number) => number): number {
  return points.reduce((sum, [x, weight]) => sum + weight * (of(x) + of(-x)), 0);
}
