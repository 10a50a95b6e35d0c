import type { InteractionCurve } from '../contract';
import { textWidth } from '../member-drawing/scale';
import { fixed } from '../quantity/format';

type Point = InteractionCurve['point'];

/** A number at its tick. */
interface Tick {
  readonly at: number;
  readonly text: string;
}

/** An interaction curve in px, for one width. */
export interface InteractionLayout {
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly across: readonly Tick[];
  readonly up: readonly Tick[];
  readonly area: string;
  readonly curve: string;
  readonly point: { readonly x: number; readonly y: number };
}

const PLOT = 190;
const TOP = 30;
const UNDER = 44;

/** Puts the curve and its point between two axes that begin at nothing. */
export function layoutInteraction(
  { curve, point }: InteractionCurve,
  width: number,
): InteractionLayout {
  const all = [...curve, size(point)];
  const xs = ticksTo(Math.max(...all.map(({ x }) => x)));
  const ys = ticksTo(Math.max(...all.map(({ y }) => y)));
  const left = Math.max(...ys.map((value) => textWidth(fixed(value, decimals(ys))))) + 12;
  const names = xs.map((value) => fixed(value, decimals(xs)));
  const widest = Math.max(...names.map(textWidth));
  // Half of the last number stands beyond its tick.
  const right = width - Math.max(20, widest / 2 + 2);
  const apart = Math.ceil((widest + 8) / ((right - left) / (xs.length - 1)));
  const bottom = TOP + PLOT;
  const [mostX, mostY] = [xs.at(-1) ?? 1, ys.at(-1) ?? 1];
  const px = (value: number): number => Math.round(value * 10) / 10;
  const x = (value: number): number => px(left + (value / mostX) * (right - left));
  const y = (value: number): number => px(bottom - (value / mostY) * PLOT);
  const line = curve.map((one, index) => `${index === 0 ? 'M' : 'L'}${x(one.x)} ${y(one.y)}`);
  const shown = size(point);
  return {
    height: bottom + UNDER,
    left,
    right,
    top: TOP,
    bottom,
    across: xs.map((value, index) => ({
      at: x(value),
      text: index % apart === 0 ? (names[index] ?? '') : '',
    })),
    up: ys.map((value) => ({ at: y(value), text: fixed(value, decimals(ys)) })),
    area: `${line.join('')}L${x(0)} ${y(0)}Z`,
    curve: line.join(''),
    point: { x: x(shown.x), y: y(shown.y) },
  };
}

/** Both effects act either way; the curve is drawn for their sizes. */
const size = ({ x, y }: Point): Point => ({ x: Math.abs(x), y: Math.abs(y) });

/** As many decimals as the step has itself. */
function decimals([, step = 1]: readonly number[]): number {
  let count = 0;
  while (count < 9 && Math.abs(step * 10 ** count - Math.round(step * 10 ** count)) > 1e-6)
    count += 1;
  return count;
}

/** Round numbers from nothing to just beyond the greatest. */
function ticksTo(greatest: number): number[] {
  const rough = Math.max(greatest, 1e-9) / 5;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 2.5, 5, 10].find((one) => one * power >= rough) ?? 10) * power;
  const count = Math.ceil(greatest / step + 1e-9);
  return Array.from({ length: count + 1 }, (_, index) => index * step);
}

/** Whether what acts lies within the curve and the axes. */
export function isInside({ curve, point }: InteractionCurve): boolean {
  const { x, y } = size(point);
  const outline = [{ x: 0, y: 0 }, ...curve];
  // On the curve itself it still holds.
  const [px, py] = [x * (1 - 1e-9), y * (1 - 1e-9)];
  return outline.reduce((inside, one, index) => {
    const next = outline[(index + 1) % outline.length] ?? one;
    const spans = one.y > py !== next.y > py;
    const at = one.x + ((py - one.y) / (next.y - one.y)) * (next.x - one.x);
    return spans && px < at ? !inside : inside;
  }, false);
}
