import type { BeamFrame, LoadVector } from './beam-frame';

/** Sum of transverse loads. */
export interface Resultant {
  /** In N, positive towards the supports. */
  readonly force: number;
  /** About the first support in N mm: what Σ reaction · x has to balance. */
  readonly moment: number;
  /** Sum of the loads' amounts in N (couples over the member's length): the scale of rounding. */
  readonly size: number;
}

export function resultantOf(frame: BeamFrame, { intensity, force, moment }: LoadVector): Resultant {
  const { breaks, lengths } = frame;
  const length = breaks[breaks.length - 1]! - breaks[0]!;
  const sum = { force: 0, moment: 0, size: 0 };
  lengths.forEach((h, i) => {
    const [q0, q1] = [intensity[2 * i]!, intensity[2 * i + 1]!];
    const part = ((q0 + q1) * h) / 2;
    sum.force += part;
    sum.moment += part * breaks[i]! + (h * h * (q0 + 2 * q1)) / 6;
    sum.size += ((Math.abs(q0) + Math.abs(q1)) * h) / 2;
  });
  breaks.forEach((x, i) => {
    sum.force += force[i]!;
    sum.moment += force[i]! * x + moment[i]!;
    sum.size += Math.abs(force[i]!) + Math.abs(moment[i]!) / length;
  });
  return sum;
}
