import type { Option } from '../fields/choice-field';

/** Dimensions of a section by the names of a request. */
export type DimensionName = 'h' | 'b' | 'd' | 't' | 'tw' | 'tf' | 'r' | 'r1' | 'r2';

/** How a section is drawn and calculated; a square hollow section is a rectangular one. */
export type ShapeName = 'I' | 'channel' | 'RHS' | 'SHS' | 'CHS' | 'angle' | 'rectangle' | 'round';

/** A shape to choose, with what the request says of its making. */
interface ShapeChoice {
  readonly label: string;
  readonly shape: ShapeName;
  readonly fabrication?: 'rolled' | 'welded';
  readonly forming?: 'hot-finished' | 'cold-formed';
}

const CHOICES = {
  rolled: { label: 'I or H, rolled', shape: 'I', fabrication: 'rolled' },
  welded: { label: 'I or H, welded', shape: 'I', fabrication: 'welded' },
  channel: { label: 'channel', shape: 'channel' },
  'RHS hot': { label: 'RHS, hot-finished', shape: 'RHS', forming: 'hot-finished' },
  'RHS cold': { label: 'RHS, cold-formed', shape: 'RHS', forming: 'cold-formed' },
  'SHS hot': { label: 'SHS, hot-finished', shape: 'SHS', forming: 'hot-finished' },
  'SHS cold': { label: 'SHS, cold-formed', shape: 'SHS', forming: 'cold-formed' },
  'CHS hot': { label: 'CHS, hot-finished', shape: 'CHS', forming: 'hot-finished' },
  'CHS cold': { label: 'CHS, cold-formed', shape: 'CHS', forming: 'cold-formed' },
  angle: { label: 'angle', shape: 'angle' },
  rectangle: { label: 'rectangle, solid', shape: 'rectangle' },
  round: { label: 'round, solid', shape: 'round' },
} as const satisfies Record<string, ShapeChoice>;

/** How the section is named: by a designation of the catalogue or by a shape with its dimensions. */
export type SectionWay = 'designation' | keyof typeof CHOICES;

/** The ways to name a section. */
export const sectionWays: readonly Option[] = [
  { value: 'designation', label: 'its designation' },
  ...Object.entries(CHOICES).map(([value, { label }]) => ({ value, label })),
];

/** The shape behind a way of naming a section by its dimensions. */
export function choiceOf(way: SectionWay): ShapeChoice | null {
  return way === 'designation' ? null : CHOICES[way];
}

/** The way that names a shape made so. */
export function wayOf(shape: string, making: string | undefined): SectionWay {
  const ways = Object.keys(CHOICES) as (keyof typeof CHOICES)[];
  const alike = ways.filter((way) => CHOICES[way].shape === shape);
  const made = alike.find((way) => {
    const { fabrication, forming }: ShapeChoice = CHOICES[way];
    return making === (fabrication ?? forming);
  });
  return made ?? alike[0] ?? 'designation';
}

/** One dimension to ask for. */
export interface DimensionField {
  readonly name: DimensionName;
  readonly label: string;
  /** Whether the request can do without it. */
  readonly optional?: true;
}

const depth: DimensionField = { name: 'h', label: 'h, depth' };
const width: DimensionField = { name: 'b', label: 'b, width' };
const walls: DimensionField = { name: 't', label: 't, walls' };
const plates: readonly DimensionField[] = [
  depth,
  { name: 'b', label: 'b, flanges' },
  { name: 'tw', label: 'tw, web' },
  { name: 'tf', label: 'tf, flanges' },
];
const root: DimensionField = { name: 'r', label: 'r, root', optional: true };

/** The dimensions that a shape is given by, in the order of the request. */
export function dimensionFields(way: SectionWay): readonly DimensionField[] {
  if (way === 'welded') return [...plates, { ...root, label: 'weld, leg' }];
  switch (choiceOf(way)?.shape) {
    case 'I':
    case 'channel':
      return [...plates, root];
    case 'RHS':
      return [depth, width, walls];
    case 'SHS':
      return [{ ...depth, label: 'h, side' }, walls];
    case 'CHS':
      return [{ name: 'd', label: 'd, outer' }, walls];
    case 'angle':
      return [
        { ...depth, label: 'h, leg along z' },
        { ...width, label: 'b, leg along y' },
        { ...walls, label: 't, legs' },
        { name: 'r1', label: 'r1, root', optional: true },
        { name: 'r2', label: 'r2, toes', optional: true },
      ];
    case 'rectangle':
      return [width, depth];
    case 'round':
      return [{ name: 'd', label: 'd, diameter' }];
    default:
      return [];
  }
}

/** Whether torsion on it splits into St Venant and warping parts. */
export function isOpen(shape: string): boolean {
  return ['I', 'channel', 'angle'].includes(shape);
}
