import type { ShapeOf } from '../sections/shapes/shape';
import { angleStresses } from './shapes/angle';
import { sectionPlane, type Plane } from './plane';
import type { Gross, Station } from './station';

/** tau t over the force along one axis, 1/mm: the shear flow of unsymmetrical bending. */
export function flowPerForce(
  { S_y, S_z }: Pick<Station, 'S_y' | 'S_z'>,
  { I_y, I_z, I_yz, D }: Plane,
  direction: 'z' | 'y',
): number {
  return direction === 'z' ? (I_z * S_y - I_yz * S_z) / D : (I_y * S_z - I_yz * S_y) / D;
}

/** Greatest elastic shear stress in the legs of an angle over the force along one axis, 1/mm². */
export function greatestShear(shape: ShapeOf<'angle'>, gross: Gross, direction: 'z' | 'y'): number {
  const plane = sectionPlane(shape, gross);
  const peaks = angleStresses(shape, gross).walls.map(({ stations }) => {
    const [start, middle, end] = [
      stations[0],
      stations[stations.length / 2 - 0.5],
      stations.at(-1),
    ];
    if (!start || !middle || !end) throw new Error('a wall has two ends and a middle');
    return peakOfParabola(
      ...([start, middle, end].map((one) => flowPerForce(one, plane, direction)) as [
        number,
        number,
        number,
      ]),
    );
  });
  return Math.max(...peaks) / shape.t;
}

/** Greatest size of a parabola through its values at 0, 1/2 and 1, on that stretch. */
function peakOfParabola(start: number, middle: number, end: number): number {
  const curvature = 2 * (start - 2 * middle + end);
  const slope = 4 * middle - 3 * start - end;
  const at = curvature === 0 ? 0 : -slope / (2 * curvature);
  const vertex = at > 0 && at < 1 ? start + slope * at + curvature * at ** 2 : 0;
  return Math.max(Math.abs(start), Math.abs(end), Math.abs(vertex));
}
