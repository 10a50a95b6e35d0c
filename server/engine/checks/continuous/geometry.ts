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

/** Ends of the member in mm from the first support. */
export function memberEnds(layout: SupportLayout): {
  readonly start: number;
  readonly end: number;
} {
  const length = layout.spans.reduce((sum, span) => sum + span, 0);
  return { start: -layout.overhangs.start, end: length + layout.overhangs.end };
}
