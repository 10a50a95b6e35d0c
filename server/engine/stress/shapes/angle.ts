import type { ShapeOf } from '../../sections/shapes/shape';
import { plain, steps, type Gross, type Station, type StressShape } from '../station';

/** Heel, toes and root; the heel at the lower left, leg h upwards, leg b to the right. */
export function angleStresses(shape: ShapeOf<'angle'>, gross: Gross): StressShape {
  const { h, b, t } = shape;
  const { y_c = 0, z_c = 0 } = gross;
  const upright = (z: number): Station => onUpright(shape, gross, z);
  const flat = (y: number): Station => onFlat(shape, gross, y);
  const heel = { y: -y_c, z: z_c };
  const corner = upright(z_c - t / 2);
  return {
    named: [
      { ...corner, ...heel, id: 'heel', title: 'Heel' },
      {
        ...upright(z_c - h),
        y: -y_c,
        id: 'toe-vertical',
        title: 'Toe of the upright leg',
      },
      { ...flat(b - y_c), z: z_c, id: 'toe-horizontal', title: 'Toe of the flat leg' },
      { ...corner, y: -y_c + t, z: z_c - t, id: 'root', title: 'Root' },
    ],
    walls: [
      {
        id: 'leg-vertical',
        title: 'Upright leg',
        t,
        stations: steps(20).map((part) => upright(z_c - h + part * (h - t / 2))),
      },
      {
        id: 'leg-horizontal',
        title: 'Flat leg',
        t,
        stations: steps(20).map((part) => flat(-y_c + t / 2 + part * (b - t / 2))),
      },
    ],
  };
}

/** On the middle of the upright leg; what is above is cut off. */
function onUpright({ h, t }: ShapeOf<'angle'>, { y_c = 0, z_c = 0 }: Gross, z: number): Station {
  const y = -y_c + t / 2;
  const top = z_c - h;
  const beyond = z - top;
  return plain({ y, z, t, S_y: (t * beyond * (z + top)) / 2, S_z: t * beyond * y, torsion: 1 });
}

/** On the middle of the flat leg; what is to the right is cut off. */
function onFlat({ b, t }: ShapeOf<'angle'>, { y_c = 0, z_c = 0 }: Gross, y: number): Station {
  const z = z_c - t / 2;
  const toe = b - y_c;
  const beyond = toe - y;
  return plain({ y, z, t, S_y: t * beyond * z, S_z: (t * beyond * (toe + y)) / 2, torsion: 1 });
}
