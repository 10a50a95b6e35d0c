import { silentSheet } from '../../formula/sheet';
import type { SectionShape } from '../../sections/shapes/shape';
import type { CheckAnswer } from '../contract';
import { classFor } from '../cross-section/resistances';
import { ineffectiveStrips, type Strip } from '../steel/strips';
import type { SteelSection } from '../steel/section';
import { sizes, type SignedEffects } from './effects';

type Sketch = NonNullable<CheckAnswer['section']>;

/** The section for a drawing, with what class 4 leaves out under each effect that acts. */
export function sketchOf(section: SteelSection, signed: SignedEffects): Sketch {
  const effects = sizes(signed);
  const { name, shape, gross } = section;
  const strips: Strip[] = [];
  const { compression, M_y, M_z } = effects;
  const slender = (axis: 'y' | 'z'): boolean =>
    classFor(section, effects, [axis], silentSheet) === 4;
  if (compression > 0 && (slender('y') || slender('z')))
    strips.push(...ineffectiveStrips(section, 'N', 1));
  if (M_y > 0 && slender('y'))
    strips.push(...ineffectiveStrips(section, 'My', Math.sign(signed.M_y)));
  if (M_z > 0 && slender('z'))
    strips.push(...ineffectiveStrips(section, 'Mz', Math.sign(signed.M_z)));
  return {
    name,
    shape: shape.shape,
    ...(shape.shape === 'I' && { fabrication: shape.fabrication }),
    dimensions: { ...dimensionsOf(shape), ...centroidOf(gross) },
    ineffective: strips,
  };
}

function centroidOf({ y_c, z_c }: SteelSection['gross']): Record<string, number> {
  return {
    ...(y_c === undefined ? {} : { yc: y_c }),
    ...(z_c === undefined ? {} : { zc: z_c }),
  };
}

/** By the names of a request. */
function dimensionsOf(shape: SectionShape): Record<string, number> {
  switch (shape.shape) {
    case 'I':
    case 'channel': {
      const { h, b, t_w: tw, t_f: tf, r, taper } = shape;
      return { h, b, tw, tf, r, ...(taper && { slope: taper.slope, r2: taper.r_2 }) };
    }
    case 'RHS': {
      const { h, b, t, r_o: ro, r_i: ri } = shape;
      return { h, b, t, ro, ri };
    }
    case 'CHS':
      return { d: shape.d, t: shape.t };
    case 'angle': {
      const { h, b, t, r_1: r1, r_2: r2 } = shape;
      return { h, b, t, r1, r2 };
    }
    case 'rectangle':
      return { b: shape.b, h: shape.h };
    case 'round':
      return { d: shape.d };
  }
}
