import type { BeamGeometry } from '../../analysis/beam.types';
import { readQuantity } from '../../units/quantity';
import type { WalerRequest } from '../contract';
import { refuse } from '../refuse';

/** The part of a request that places the supports. */
type GeometryInput = Pick<WalerRequest, 'spans' | 'overhangs' | 'supportStiffness'>;

/** Spans, overhangs (mm) and support stiffness (N/mm, null rigid); without the section. */
export type SupportLayout = Omit<BeamGeometry, 'flexuralRigidity'>;

export function readLayout(request: GeometryInput): SupportLayout {
  const spans = request.spans.map((span) => readQuantity(span, 'm'));
  const overhangs = {
    start: readQuantity(request.overhangs?.start ?? 0, 'm'),
    end: readQuantity(request.overhangs?.end ?? 0, 'm'),
  };
  spans.forEach((span, index) => longEnough(span, `/spans/${index}`));
  if (overhangs.start > 0) longEnough(overhangs.start, '/overhangs/start');
  if (overhangs.end > 0) longEnough(overhangs.end, '/overhangs/end');
  const supports = spans.length + 1;
  const stiffness = request.supportStiffness ?? Array.from({ length: supports }, () => null);
  if (stiffness.length !== supports) {
    refuse(
      'wrong-count',
      '/supportStiffness',
      `${spans.length} spans have ${supports} supports; ${stiffness.length} stiffnesses are given.`,
    );
  }
  return {
    spans,
    overhangs,
    supportStiffness: stiffness.map((one) => (one === null ? null : readQuantity(one, 'kN/mm'))),
  };
}

/** mm: shorter is a slip of the unit, and beyond what the solver can tell apart from nothing. */
const SHORTEST = 10;

function longEnough(length: number, pointer: string): void {
  if (length >= SHORTEST) return;
  refuse(
    'too-short',
    pointer,
    `${length} mm is no span; the shortest that is taken is ${SHORTEST} mm.`,
  );
}

/** Ends of the member in mm from the first support. */
export function memberEnds(layout: SupportLayout): {
  readonly start: number;
  readonly end: number;
} {
  const length = layout.spans.reduce((sum, span) => sum + span, 0);
  return { start: -layout.overhangs.start, end: length + layout.overhangs.end };
}
