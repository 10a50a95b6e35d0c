import type { Sheet } from '../../formula/sheet';
import type { Formula } from '../../formula/formula';
import type { ShapeOf } from '../../sections/shapes/shape';
import {
  angleLegLimit,
  angleLegSlenderness,
  angleSumLimit,
  angleSumSlenderness,
  bentWebLimits,
  channelOutstand,
  compressedFlangeLimits,
  compressedWebLimits,
  elasticWebLimit,
  epsilonFactor,
  flangeOutstand,
  flangeSlenderness,
  outstandLimits,
  plasticDepthInCompression,
  plasticWebLimits,
  squashedWebLimits,
  stressRatioOfWeb,
  tubeLimits,
  tubeSlenderness,
  wallAsFlange,
  wallAsWeb,
  webDepth,
  webSlenderness,
  type SectionClass,
} from '../../steel/classification';
import type { SteelSection } from './section';

/** About which axis moments bend, or the section under compression alone. */
export type Loading = 'y' | 'z' | 'compression';

/** A plate of the section as the standard's tables of widths to thickness see it. */
export interface Plate {
  readonly kind: 'outstand' | 'internal';
  /** Width between roots or straight width, mm. */
  readonly c: number;
  readonly t: number;
  /** How many of it the section has. */
  readonly count: number;
}

/** The plates that bending about an axis compresses whole, and those that it bends. */
export interface Plates {
  readonly flange: Plate;
  readonly web: Plate;
}

type Plated = ShapeOf<'I'> | ShapeOf<'channel'> | ShapeOf<'RHS'>;

export function isPlated(shape: SteelSection['shape']): shape is Plated {
  return shape.shape === 'I' || shape.shape === 'channel' || shape.shape === 'RHS';
}

/** Flange and web of bending about `axis`; of a hollow section the walls change roles with it. */
export function platesOf(shape: Plated, axis: 'y' | 'z', sheet: Sheet): Plates {
  if (shape.shape === 'RHS') {
    const { h, b, t } = shape;
    const wall = { kind: 'internal', t, count: 2 } as const;
    const aboutY = axis === 'y';
    return {
      flange: {
        ...wall,
        c: aboutY
          ? sheet.evaluate(wallAsFlange.b, { b, t })
          : sheet.evaluate(wallAsFlange.h, { h, t }),
      },
      web: {
        ...wall,
        c: aboutY ? sheet.evaluate(wallAsWeb.h, { h, t }) : sheet.evaluate(wallAsWeb.b, { b, t }),
      },
    };
  }
  const { h, b, t_w, t_f, r } = shape;
  const web = { kind: 'internal', t: t_w, count: 1 } as const;
  const flange =
    shape.shape === 'I'
      ? ({ c: sheet.evaluate(flangeOutstand, { b, t_w, r }), count: 4 } as const)
      : ({ c: sheet.evaluate(channelOutstand, { b, t_w, r }), count: 2 } as const);
  return {
    flange: { kind: 'outstand', t: t_f, ...flange },
    web: { ...web, c: sheet.evaluate(webDepth, { h, t_f, r }) },
  };
}

/**
 * Class of the section from N_Ed alone, so that more moment never makes it lower (contract,
 * section 4): the worst of its parts.
 *
 * @param N_Ed compression in N, 0 under tension: tension helps a web, and is given no credit
 */
export function classOf(
  section: SteelSection,
  loading: Loading,
  N_Ed: number,
  sheet: Sheet,
): SectionClass {
  const { shape, f_y } = section;
  if (shape.shape === 'rectangle' || shape.shape === 'round') {
    return chosen(sheet, loading, 1, 'a solid has no part that could buckle locally');
  }
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  if (shape.shape === 'CHS') {
    const { d, t } = shape;
    const tube = rankOf(sheet.evaluate(tubeSlenderness, { d, t }), tubeLimits, epsilon, sheet);
    return chosen(sheet, loading, tube, 'by its diameter to thickness');
  }
  if (shape.shape === 'angle') return angleClass(shape, loading, N_Ed, epsilon, sheet);
  const { flange, web } = platesOf(shape, loading === 'z' ? 'z' : 'y', sheet);
  const flangeClass = rankOf(
    sheet.evaluate(flangeSlenderness, { c_f: flange.c, t_f: flange.t }),
    flange.kind === 'outstand' ? outstandLimits : compressedFlangeLimits,
    epsilon,
    sheet,
  );
  // A channel bent about z-z may have its whole web compressed.
  const whole = loading === 'z' && shape.shape === 'channel';
  const slenderness = sheet.evaluate(webSlenderness, { c_w: web.c, t_w: web.t });
  const webClass =
    loading === 'compression' || whole
      ? rankOf(slenderness, whole ? compressedWebLimits : squashedWebLimits, epsilon, sheet)
      : bentWebClass(section, web, slenderness, N_Ed, epsilon, sheet);
  const worst = Math.max(flangeClass, webClass) as SectionClass;
  return chosen(
    sheet,
    loading,
    worst,
    `flange class ${flangeClass}, web class ${webClass} ${wordsOf(loading)}; the greater counts`,
  );
}

function wordsOf(loading: Loading): string {
  return loading === 'compression' ? 'in compression' : `in bending about ${loading}-${loading}`;
}

function chosen(
  sheet: Sheet,
  loading: Loading,
  value: SectionClass,
  because: string,
): SectionClass {
  const squashed = loading === 'compression';
  sheet.choose(() => ({
    symbol: squashed ? 'squash_class' : 'section_class',
    title: squashed ? 'Class under uniform compression' : 'Class of the cross-section',
    because,
    value,
    clause: 'EN 1993-1-1 5.5.2(6)',
  }));
  return value;
}

function rankOf(
  slenderness: number,
  limits: readonly Formula<'epsilon'>[],
  epsilon: number,
  sheet: Sheet,
): SectionClass {
  const passed = limits.findIndex((limit) => slenderness <= sheet.evaluate(limit, { epsilon }));
  return (passed === -1 ? 4 : passed + 1) as SectionClass;
}

/** A web that bends while N_Ed compresses it. */
function bentWebClass(
  section: SteelSection,
  web: Plate,
  slenderness: number,
  N_Ed: number,
  epsilon: number,
  sheet: Sheet,
): SectionClass {
  if (N_Ed === 0) return rankOf(slenderness, bentWebLimits, epsilon, sheet);
  const { f_y, properties } = section;
  const alpha = sheet.evaluate(plasticDepthInCompression, {
    N_Ed,
    n_w: web.count,
    c_w: web.c,
    t_w: web.t,
    f_y,
  });
  const passed = plasticWebLimits.findIndex(
    (limit) => slenderness <= sheet.evaluate(limit, { epsilon, alpha }),
  );
  if (passed !== -1) return (passed + 1) as SectionClass;
  const psi = sheet.evaluate(stressRatioOfWeb, { N_Ed, A: properties.A, f_y });
  return slenderness <= sheet.evaluate(elasticWebLimit, { epsilon, psi }) ? 3 : 4;
}

/**
 * Never below class 3: an angle is not verified plastic here. Sheet 3 is of compression; bending alone
 * has the legs as outstands.
 */
function angleClass(
  angle: ShapeOf<'angle'>,
  loading: Loading,
  N_Ed: number,
  epsilon: number,
  sheet: Sheet,
): SectionClass {
  const { h, b, t, r_1 } = angle;
  const c_f = Math.max(h, b) - t - r_1;
  const outstand = sheet.evaluate(flangeSlenderness, { c_f, t_f: t });
  const bent = rankOf(outstand, outstandLimits, epsilon, sheet) < 4;
  if (loading !== 'compression' && N_Ed === 0) {
    const words = bent
      ? 'as outstands both legs are within class 3'
      : 'a leg is a slender outstand';
    return chosen(sheet, loading, bent ? 3 : 4, words);
  }
  const leg = sheet.evaluate(angleLegSlenderness, { h, b, t });
  const legLimit = sheet.evaluate(angleLegLimit, { epsilon });
  const sum = sheet.evaluate(angleSumSlenderness, { h, b, t });
  const sumLimit = sheet.evaluate(angleSumLimit, { epsilon });
  const slender = leg > legLimit || sum > sumLimit || !bent;
  return chosen(
    sheet,
    loading,
    slender ? 4 : 3,
    slender ? 'a leg is more slender than class 3 allows' : 'both legs are within class 3',
  );
}
