import type { IneffectiveStrip } from '../contract';
import { textWidth } from '../member-drawing/scale';
import { fitSection, type Fit } from './fit-section';
import type { SectionModel } from './section-model';

/** A text with its place and, where it stands apart from what it names, a line to it. */
export interface Label {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly line?: string;
}

/** A section in px, for one width. */
export interface SectionLayout {
  readonly width: number;
  readonly height: number;
  readonly outline: string;
  readonly hatches: readonly { readonly edge: string; readonly lines: string }[];
  /** Lines of the axes and the heads that say where they run. */
  readonly axes: string;
  readonly heads: string;
  readonly letters: readonly Label[];
  readonly dimensions: string;
  readonly sizes: readonly Label[];
  readonly marks: readonly Label[];
}

const AXIS = 16;
const LINE = 17;

/** Draws the section for a width: to scale, texts always 12 px. */
export function layoutSection(model: SectionModel, width: number): SectionLayout {
  const { bounds, marks, depth } = model;
  const markWidth = Math.max(0, ...marks.map(({ text }) => textWidth(text)));
  const gutters = {
    left: textWidth(depth) + 22,
    right: (markWidth > 0 ? markWidth + 22 : 0) + AXIS + 14,
    top: model.width ? 32 : 14,
    bottom: AXIS + 22,
  };
  const fit = fitSection(bounds, width, gutters);
  return {
    width,
    height: fit.height,
    outline: model.outlines.map((outline) => fit.path(outline)).join(''),
    hatches: model.ineffective.map((strip) => hatch(fit, strip)),
    ...axesOf(fit, model),
    ...dimensionsOf(fit, model),
    marks: marksBeside(fit, model),
  };
}

function axesOf(fit: Fit, { bounds }: SectionModel) {
  const [x, y] = [fit.x(0), fit.y(0)];
  const [left, right] = [fit.x(bounds.left) - 8, fit.x(bounds.right) + AXIS];
  const [top, bottom] = [fit.y(bounds.top) - 8, fit.y(bounds.bottom) + AXIS];
  return {
    axes: `M${left} ${y}H${right}M${x} ${top}V${bottom}`,
    heads:
      `M${right - 7} ${y - 3.5}L${right} ${y}L${right - 7} ${y + 3.5}Z` +
      `M${x - 3.5} ${bottom - 7}L${x} ${bottom}L${x + 3.5} ${bottom - 7}Z`,
    letters: [
      { x: right + 8, y: y + 4, text: 'y' },
      { x, y: bottom + 14, text: 'z' },
    ],
  };
}

/** Depth at the left and width above, each between its ticks. */
function dimensionsOf(fit: Fit, { bounds, depth, width }: SectionModel) {
  const [left, right] = [fit.x(bounds.left), fit.x(bounds.right)];
  const [top, bottom] = [fit.y(bounds.top), fit.y(bounds.bottom)];
  const beside = left - 14;
  const above = top - 14;
  const down = `M${beside} ${top}V${bottom}M${beside - 4} ${top}h8M${beside - 4} ${bottom}h8`;
  const across = `M${left} ${above}H${right}M${left} ${above - 4}v8M${right} ${above - 4}v8`;
  const middle = (left + right) / 2;
  // Beside the depth's own middle runs the axis.
  const sizes = [
    { x: beside - 6 - textWidth(depth) / 2, y: (top + bottom) / 2 + 4, text: depth },
    ...(width ? [{ x: middle, y: above - 6, text: width }] : []),
  ];
  return { dimensions: width ? down + across : down, sizes };
}

/** The marks in a column at the right, each with a line to its place, clear of the axis. */
function marksBeside(fit: Fit, { bounds, marks }: SectionModel): Label[] {
  const x = fit.x(bounds.right) + AXIS + 8;
  const axis = fit.y(0);
  let free = fit.y(bounds.top) - 8;
  return marks.map(({ text, y, z }) => {
    let at = Math.max(free, fit.y(z));
    if (Math.abs(at - axis) < 14) at = axis + 16;
    free = at + LINE;
    const elbow = x - 8;
    const line = `M${fit.x(y)} ${fit.y(z)}L${elbow} ${at}H${x - 3}`;
    return { x, y: at + 4, text, line };
  });
}

/** A thin plate's strip is drawn no thinner, or its lines could not be seen. */
const THINNEST = 9;

/** A strip with lines across it every few px, so that it shows without any colour. */
function hatch(fit: Fit, strip: IneffectiveStrip) {
  const half = (size: number): number => Math.max(size * fit.scale, THINNEST) / 2;
  const [x, y] = [fit.x(strip.y), fit.y(strip.z)];
  const [left, right] = [x - half(strip.width), x + half(strip.width)];
  const [top, bottom] = [y - half(strip.height), y + half(strip.height)];
  // Lines x + lean · y = sum; level ones are drawn apart.
  const lean = strip.under === 'My' ? -1 : 1;
  const parts: string[] = [];
  if (strip.under === 'Mz') {
    for (let at = top + 3; at < bottom; at += 4)
      parts.push(`M${round(left)} ${round(at)}H${round(right)}`);
  } else {
    const ends = [
      left + lean * top,
      left + lean * bottom,
      right + lean * top,
      right + lean * bottom,
    ];
    for (let sum = Math.min(...ends) + 4; sum < Math.max(...ends); sum += 5) {
      const [a, b] = [sum - lean * top, sum - lean * bottom];
      const from = Math.max(left, Math.min(a, b));
      const to = Math.min(right, Math.max(a, b));
      const at = (x: number): number => lean * (sum - x);
      parts.push(`M${round(from)} ${round(at(from))}L${round(to)} ${round(at(to))}`);
    }
  }
  const edge = `M${round(left)} ${round(top)}H${round(right)}V${round(bottom)}H${round(left)}Z`;
  return { edge, lines: parts.join('') };
}

const round = (value: number): number => Math.round(value * 10) / 10;
