/** Width of one mark of 12 px JetBrains Mono, with a little air. */
const MARK = 7.25;

/** How wide a text of 12 px in the mono is. */
export function textWidth(text: string): number {
  return text.length * MARK;
}

/** From m along the member to px across the drawing. */
export interface Scale {
  readonly left: number;
  readonly right: number;
  x(position: number): number;
}

/** A member from `first` to `last` between two margins. */
export function scaleOf(
  width: number,
  first: number,
  last: number,
  left: number,
  right: number,
): Scale {
  const room = Math.max(40, width - left - right);
  const factor = room / Math.max(last - first, 1e-9);
  return {
    left,
    right: left + room,
    x: (position) => Math.round((left + (position - first) * factor) * 10) / 10,
  };
}
