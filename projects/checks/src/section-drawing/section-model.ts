import type { IneffectiveStrip, SectionLine, SectionSketch } from '../contract';
import { readable } from '../quantity/format';
import { sizesOf, type SectionDraft } from '../section-fields/section-draft';
import { choiceOf } from '../section-fields/section-shapes';
import { outlinesOf, type Drawable, type Mark, type Outlines, type Sizes } from './outlines';
import { centroidOf, type Place } from './polygon';

/** The least and the greatest of an outline, in mm from the centroid. */
export interface Bounds {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** A section to draw; everything in mm from its centroid, y to the right and z downwards. */
export interface SectionModel {
  readonly name: string;
  readonly shape: string;
  readonly outlines: Outlines;
  readonly bounds: Bounds;
  /** Depth and width over all; a round has one for both. */
  readonly depth: string;
  readonly width: string;
  /** What is named beside the drawing. */
  readonly marks: readonly Mark[];
  readonly ineffective: readonly IneffectiveStrip[];
}

const WORDS: Readonly<Record<string, string>> = {
  I: 'I section',
  RHS: 'Rectangular hollow section',
  SHS: 'Square hollow section',
  CHS: 'Circular hollow section',
  channel: 'Channel',
  angle: 'Angle',
  rectangle: 'Rectangle',
  round: 'Round',
};

/** What can be drawn of a section as it is typed; null while its dimensions make none. */
export function typedSection(draft: SectionDraft, line: SectionLine | null): SectionModel | null {
  const choice = choiceOf(draft.way);
  if (choice) {
    const { shape, fabrication, forming } = choice;
    const sizes = sizesOf(draft);
    const made = { welded: fabrication === 'welded', coldFormed: forming === 'cold-formed' };
    return modelOf({ shape, sizes, ...made }, WORDS[shape] ?? shape, []);
  }
  if (!line) return null;
  return modelOf(
    { shape: line.shape ?? 'I', sizes: factsOf(line.dimensions) },
    line.designation,
    [],
  );
}

/** The numbers of the catalogue's dimensions; those of a taper stand in a group of their own. */
function factsOf(facts: object = {}): Sizes {
  const sizes: Record<string, number> = {};
  for (const [name, fact] of Object.entries(facts) as [string, { value?: number }][])
    if (fact.value === undefined) Object.assign(sizes, factsOf(fact));
    else sizes[name] = fact.value;
  return sizes;
}

/** The section of an answer, with what class 4 leaves out. */
export function answeredSection(sketch: SectionSketch): SectionModel | null {
  const { name, shape, dimensions, ineffective } = sketch;
  const welded = sketch.fabrication === 'welded';
  return modelOf({ shape, sizes: dimensions, welded }, name, ineffective);
}

function modelOf(
  drawable: Drawable,
  name: string,
  ineffective: readonly IneffectiveStrip[],
): SectionModel | null {
  const raw = outlinesOf(drawable);
  if (!raw) return null;
  const { y, z } = centroidOf(raw);
  const moved = <P extends Place>(places: readonly P[]): P[] =>
    places.map((place) => ({ ...place, y: place.y - y, z: place.z - z }));
  const outlines = raw.map((outline) => moved(outline));
  const bounds = boundsOf(outlines[0] ?? []);
  const { shape, sizes } = drawable;
  const round = sizes.d === undefined ? '' : `d ${readable(sizes.d)}`;
  const depth = round || `h ${readable(bounds.bottom - bounds.top)}`;
  const width = round ? '' : `b ${readable(bounds.right - bounds.left)}`;
  const marks = moved(marksOf(drawable, shape, sizes));
  return { name, shape, outlines, bounds, depth, width, marks, ineffective };
}

function boundsOf(outline: readonly Place[]): Bounds {
  const [ys, zs] = [outline.map(({ y }) => y), outline.map(({ z }) => z)];
  return {
    left: Math.min(...ys),
    right: Math.max(...ys),
    top: Math.min(...zs),
    bottom: Math.max(...zs),
  };
}

/** Thicknesses and radii, each at a place that it can be read off. */
function marksOf({ welded }: Drawable, shape: string, sizes: Sizes): Mark[] {
  const { h = 0, b = 0, d = 0, t = 0, tw = 0, tf = 0, r = 0, r1 = 0, r2 = 0, slope = 0 } = sizes;
  const mark = (name: string, size: number, y: number, z: number): Mark[] =>
    size > 0 ? [{ text: `${name} ${readable(size)}`, y, z }] : [];
  const toe = slope > 0 ? mark('r2', r2, shape === 'I' ? b / 2 : b, -h / 2 + tf * 0.6) : [];
  const root = welded ? 'weld' : 'r';
  switch (shape) {
    case 'I':
      return [
        ...mark('tf', tf, b / 2, -h / 2 + tf / 3),
        ...toe,
        ...mark(root, r, tw / 2 + r / 3, -h / 2 + tf + r / 3),
        ...mark('tw', tw, tw / 2, -h / 5),
      ];
    case 'channel':
      return [
        ...mark('tf', tf, b, -h / 2 + tf / 3),
        ...toe,
        ...mark('r', r, tw + r / 3, -h / 2 + tf + r / 3),
        ...mark('tw', tw, tw, -h / 5),
      ];
    case 'angle':
      return [
        ...mark('t', t, t, -h * 0.75),
        ...mark('r1', r1, t + r1 / 3, -t - r1 / 3),
        ...mark('r2', r2, b - r2 / 3, -t + r2 / 3),
      ];
    case 'CHS':
      return mark('t', t, (d / 2) * Math.SQRT1_2, (-d / 2) * Math.SQRT1_2);
    case 'RHS':
    case 'SHS': {
      const wide = shape === 'SHS' ? h : b;
      return mark('t', t, wide / 2, -h / 5);
    }
    default:
      return [];
  }
}

/** The drawing in words. */
export function sectionText({ name, depth, width, marks, ineffective }: SectionModel): string {
  const sizes = [depth, width, ...marks.map(({ text }) => text)].filter((text) => text !== '');
  const axes = 'Axes through the centroid: y to the right, z downwards.';
  const lost = ineffectiveText(ineffective);
  return `${name} to scale, in mm: ${sizes.join(', ')}. ${axes}${lost ? ` ${lost}` : ''}`;
}

/** How each effect's strips are hatched, so that those of two can be told apart where they overlap. */
const HATCHES = { N: 'to the right', My: 'to the left', Mz: 'level' } as const;

/** What the hatched strips mean: "Hatched: not effective under N." */
export function ineffectiveText(strips: readonly IneffectiveStrip[]): string {
  const effects = [...new Set(strips.map(({ under }) => under))];
  const [only, ...others] = effects;
  if (only === undefined) return '';
  if (others.length === 0) return `Hatched: not effective under ${only}.`;
  const said = effects.map((effect) => `${effect} hatched ${HATCHES[effect]}`);
  return `Not effective: under ${said.join(', under ')}.`;
}
