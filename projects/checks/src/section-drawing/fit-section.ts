import type { Bounds } from './section-model';
import type { Place } from './polygon';

/** What is left free on each side of a section, in px. */
export interface Gutters {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** From mm of a section to px of its drawing. */
export interface Fit {
  readonly height: number;
  readonly scale: number;
  x(y: number): number;
  y(z: number): number;
  path(places: readonly Place[], closed?: boolean): string;
}

/** No section is drawn larger, so that a flat does not fill the sheet. */
const TALLEST = 210;
const WIDEST = 260;

/** Puts a section to scale between its gutters; it stands in the middle of the width. */
export function fitSection(bounds: Bounds, width: number, gutters: Gutters): Fit {
  const { left, right, top, bottom } = bounds;
  const [across, down] = [right - left, bottom - top];
  const room = Math.max(60, Math.min(WIDEST, width - gutters.left - gutters.right));
  const scale = Math.min(room / across, TALLEST / down);
  const spare = width - gutters.left - gutters.right - across * scale;
  const begin = gutters.left + Math.max(0, spare / 2);
  const px = (value: number): number => Math.round(value * 10) / 10;
  const x = (y: number): number => px(begin + (y - left) * scale);
  const y = (z: number): number => px(gutters.top + (z - top) * scale);
  return {
    height: Math.ceil(gutters.top + down * scale + gutters.bottom),
    scale,
    x,
    y,
    path: (places, closed = true) =>
      places.map((one, index) => `${index === 0 ? 'M' : 'L'}${x(one.y)} ${y(one.z)}`).join('') +
      (closed ? 'Z' : ''),
  };
}
