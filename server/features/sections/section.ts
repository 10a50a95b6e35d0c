import { silentSheet } from '../../engine/formula/sheet';
import type { CatalogueEntry } from '../../engine/sections/catalogue';
import { propertiesOf, type SectionProperties } from '../../engine/sections/properties';
import type { SectionShape } from '../../engine/sections/shapes/shape';
import { quantity, type Quantity, type UnitName } from '../../engine/units/units';

type Quantities = Readonly<Record<string, Quantity>>;

/** A section never changes, and many are asked for at once. */
const answers = new WeakMap<CatalogueEntry, ReturnType<typeof facts>>();

/** A section of the catalogue as the API gives it; each name as a request would write it. */
export function toSection(entry: CatalogueEntry): ReturnType<typeof facts> {
  const known = answers.get(entry);
  if (known) return known;
  const made = facts(entry);
  answers.set(entry, made);
  return made;
}

function facts(entry: CatalogueEntry) {
  const { designation, family, shape, source, mass } = entry;
  return {
    designation,
    family,
    shape,
    ...('fabrication' in entry && { fabrication: entry.fabrication }),
    ...('forming' in entry && { forming: entry.forming }),
    source,
    mass: mass === null ? null : { value: mass, unit: 'kg/m' as const },
    dimensions: dimensionsOf(entry),
    properties: propertyValues(entry, propertiesOf(entry, silentSheet)),
  };
}

/** Leaves out what a shape does not have. */
function quantities(
  unit: UnitName,
  values: Readonly<Record<string, number | undefined>>,
): Quantities {
  return Object.fromEntries(
    Object.entries(values).flatMap(([name, value]) =>
      value === undefined ? [] : [[name, quantity(value, unit)]],
    ),
  );
}

function dimensionsOf(shape: SectionShape) {
  switch (shape.shape) {
    case 'I':
    case 'channel': {
      const { h, b, t_w: tw, t_f: tf, r, taper } = shape;
      const lengths = quantities('mm', { h, b, tw, tf, r });
      if (!taper) return lengths;
      const { slope, at, r_2: r2 } = taper;
      return {
        ...lengths,
        taper: { slope: quantity(slope, '1'), ...quantities('mm', { at, r2 }) },
      };
    }
    case 'RHS': {
      const { h, b, t, r_o: ro, r_i: ri } = shape;
      return quantities('mm', { h, b, t, ro, ri });
    }
    case 'CHS':
      return quantities('mm', { d: shape.d, t: shape.t });
    case 'angle': {
      const { h, b, t, r_1: r1, r_2: r2 } = shape;
      return quantities('mm', { h, b, t, r1, r2 });
    }
    case 'rectangle':
      return quantities('mm', { b: shape.b, h: shape.h });
    case 'round':
      return quantities('mm', { d: shape.d });
  }
}

function propertyValues(shape: SectionShape, properties: SectionProperties): Quantities {
  const { A, I_y: Iy, I_z: Iz, I_t: It, I_w: Iw, W_t: Wt } = properties;
  const { W_el_y: Wely, W_el_z: Welz, W_pl_y: Wply, W_pl_z: Wplz } = properties;
  const { y_c: yc, z_c: zc, e_0: e0 } = properties;
  const gyration = (inertia: number): number => Math.sqrt(inertia / A);
  return {
    ...quantities('mm^2', { A }),
    ...quantities('mm^4', { Iy, Iz }),
    ...quantities('mm^3', { Wely, Welz, Wply, Wplz }),
    ...quantities('mm', { iy: gyration(Iy), iz: gyration(Iz) }),
    ...quantities('mm^4', { It }),
    ...quantities('mm^6', { Iw }),
    ...quantities('mm^3', { Wt }),
    ...quantities('mm', { yc, zc, e0, ...shearCentre(shape, properties) }),
    ...(shape.shape === 'angle' && principal(properties, gyration)),
  };
}

/** Beyond the web of a channel; where the centre lines of an angle's legs meet. */
function shearCentre(
  shape: SectionShape,
  { y_c = 0, z_c = 0, e_0 = 0 }: SectionProperties,
): { y0?: number; z0?: number } {
  if (shape.shape === 'channel') return { y0: y_c + e_0 - shape.t_w / 2, z0: 0 };
  if (shape.shape === 'angle') return { y0: y_c - shape.t / 2, z0: z_c - shape.t / 2 };
  return {};
}

function principal(
  { I_yz: Iyz, I_u: Iu, I_v: Iv }: SectionProperties,
  gyration: (inertia: number) => number,
): Quantities {
  return {
    ...quantities('mm^4', { Iyz, Iu, Iv }),
    ...quantities('mm', { iu: gyration(Iu), iv: gyration(Iv) }),
  };
}
