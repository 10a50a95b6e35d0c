import type { ChannelShape, IShape, SectionShape } from './shape';

/** A dimension that cannot be, by the contract's name of it. */
export interface Impossibility {
  readonly dimension: string;
  readonly message: string;
}

/**
 * The first dimension that no such section can have: parts that would overlap, radii without room.
 * Everything that divides by a length between parts relies on it.
 */
export function impossibilityOf(shape: SectionShape): Impossibility | undefined {
  return rulesOf(shape).find(([holds]) => !holds)?.[1];
}

type Rule = readonly [holds: boolean, impossibility: Impossibility];

const rule = (holds: boolean, dimension: string, message: string): Rule => [
  holds,
  { dimension, message },
];

function rulesOf(shape: SectionShape): Rule[] {
  switch (shape.shape) {
    case 'I':
      return flangedRules(shape, 2);
    case 'channel':
      return flangedRules(shape, 1);
    case 'RHS': {
      const { h, b, t, r_o } = shape;
      const least = Math.min(h, b);
      return [
        rule(2 * t < least, 't', `Walls of ${t} mm leave no hollow in ${least} mm.`),
        rule(
          2 * r_o <= least,
          't',
          `Corners of ${r_o} mm, which go with walls of ${t} mm, have no room in ${least} mm.`,
        ),
      ];
    }
    case 'CHS': {
      const { d, t } = shape;
      return [rule(2 * t < d, 't', `A wall of ${t} mm leaves no hollow in ${d} mm.`)];
    }
    case 'angle': {
      const { h, b, t, r_1, r_2 } = shape;
      const least = Math.min(h, b);
      return [
        rule(t < least, 't', `A leg of ${least} mm is no longer than it is thick, ${t} mm.`),
        rule(t + r_1 + r_2 <= least, 'r1', `The root of ${r_1} mm has no room in ${least} mm.`),
        rule(r_2 <= t, 'r2', `The toe of ${r_2} mm is rounder than the leg is thick, ${t} mm.`),
      ];
    }
    case 'rectangle':
    case 'round':
      return [];
  }
}

/** @param outstands sides of the web that hold a flange */
function flangedRules({ h, b, t_w, t_f, r }: IShape | ChannelShape, outstands: 1 | 2): Rule[] {
  return [
    rule(2 * t_f < h, 'tf', `Two flanges of ${t_f} mm leave no web in a depth of ${h} mm.`),
    rule(t_w < b, 'tw', `The web of ${t_w} mm is no thinner than the flange is wide, ${b} mm.`),
    rule(2 * t_f + 2 * r <= h, 'r', `There is no room for roots of ${r} mm between the flanges.`),
    rule(
      t_w + outstands * r <= b,
      'r',
      `A root of ${r} mm beside the web is wider than the flange, ${b} mm.`,
    ),
  ];
}
