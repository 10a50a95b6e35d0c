import fc from 'fast-check';
import type { Detail } from '../checks/check';
import type { CheckAnswer, SectionEffects, SectionInput, SectionRequest } from '../checks/contract';
import { section } from '../checks/section/section';
import { Refusal } from '../refusal';
import { publishedRevision } from './profiles';

/** A section by its dimensions, and effects that it may or may not carry. */
export interface Loaded {
  readonly section: Extract<SectionInput, { shape: string }>;
  readonly fy: number;
  readonly effects: SectionEffects;
}

export function runSection(
  request: Omit<SectionRequest, 'profile'>,
  { profile = 'en-recommended', detail }: { profile?: string; detail?: Detail } = {},
): CheckAnswer {
  return section.run(request, { profile: publishedRevision(profile), detail: detail ?? 'summary' });
}

/** The refusal of a request that the engine will not answer. */
export function refusalOfSection(request: Omit<SectionRequest, 'profile'>): Refusal {
  try {
    runSection(request);
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
  throw new Error('the check was made');
}

export const requestOf = ({ section: input, fy, effects }: Loaded): SectionRequest => ({
  material: { type: 'steel', fy },
  section: input,
  effects,
});

/** Utilisation by verification; a resistance of zero stands above every number. */
export function utilisations(answer: CheckAnswer): Record<string, number> {
  return Object.fromEntries(
    answer.verifications.map(({ id, utilisation }) => [id, utilisation ?? Infinity]),
  );
}

const between = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true });

const flanged = fc.record({
  h: between(100, 900),
  ratio: between(0.3, 1),
  tw: between(4, 25),
  tf: between(6, 40),
  r: between(0, 20),
});

const iSection = fc
  .tuple(flanged, fc.constantFrom('rolled' as const, 'welded' as const))
  .map(([{ h, ratio, tw, tf, r }, fabrication]) => {
    const b = Math.max(h * ratio, tw + 2 * r + 10);
    return { shape: 'I' as const, h: h + 2 * tf + 2 * r, b, tw, tf, r, fabrication };
  });

const channel = flanged.map(({ h, ratio, tw, tf, r }) => {
  const b = Math.max(h * ratio * 0.6, tw + r + 10);
  return { shape: 'channel' as const, h: h + 2 * tf + 2 * r, b, tw, tf, r };
});

const forming = fc.constantFrom('hot-finished' as const, 'cold-formed' as const);

const rhs = fc
  .tuple(between(2, 16), between(7, 60), between(0.5, 1), forming)
  .map(([t, slenderness, ratio, formed]) => {
    const h = t * slenderness;
    return { shape: 'RHS' as const, h, b: Math.max(h * ratio, 6.5 * t), t, forming: formed };
  });

const chs = fc.tuple(between(3, 16), between(4, 60), forming).map(([t, slenderness, formed]) => ({
  shape: 'CHS' as const,
  d: t * slenderness,
  t,
  forming: formed,
}));

const angle = fc
  .tuple(between(5, 20), between(4, 8), between(0.6, 1))
  .map(([t, slender, ratio]) => {
    const h = t * slender;
    return { shape: 'angle' as const, h, b: Math.max(h * ratio, 3 * t), t, r1: t, r2: t / 2 };
  });

const rectangle = fc
  .tuple(between(10, 300), between(10, 300))
  .map(([b, h]) => ({ shape: 'rectangle' as const, b, h }));

const round = between(10, 200).map((d) => ({ shape: 'round' as const, d }));

/** Any section by its dimensions, possible in all of them. */
export const anySection = fc.oneof(iSection, channel, rhs, chs, angle, rectangle, round);

/** A part of what the section might carry, one way or the other, or none. */
const part = fc.oneof(
  { weight: 1, arbitrary: fc.constant(0) },
  { weight: 1, arbitrary: between(0.001, 0.5) },
  { weight: 1, arbitrary: between(-0.5, -0.001) },
);

/** A section of any shape and class with effects from nothing to beyond what it carries. */
export const loaded: fc.Arbitrary<Loaded> = fc
  .tuple(
    anySection,
    fc.constantFrom(235, 275, 355, 460),
    fc.array(part, { minLength: 6, maxLength: 6 }),
    fc.boolean(),
  )
  .map(([input, fy, parts, pulled]) => {
    const { A, W } = sizeOf(input);
    const [n = 0, my = 0, mz = 0, vz = 0, vy = 0, t = 0] = parts;
    // Of an open section only its analysis tells the parts of torsion.
    const twists = !['I', 'channel', 'angle'].includes(input.shape);
    const N = (Math.abs(n) * A * fy) / 1e3;
    return {
      section: input,
      fy,
      effects: {
        ...(pulled ? { tension: N } : { compression: N }),
        My: (my * W.y * fy) / 1e6,
        Mz: (mz * W.z * fy) / 1e6,
        Vz: (vz * A * fy) / 2e3,
        Vy: (vy * A * fy) / 2e3,
        ...(twists && { T: (t * Math.min(W.y, W.z) * fy) / 1e6 }),
      },
    };
  });

/** Rough area in mm² and moduli in mm³: what scales the effects. */
function sizeOf(input: Loaded['section']): { A: number; W: { y: number; z: number } } {
  const { values } = runSection({
    material: { type: 'steel', fy: 235 },
    section: input,
    effects: { tension: 1 },
  });
  const of = (symbol: string): number => values[symbol]?.value ?? 0;
  const A = of('A');
  const I = { y: of('I_y'), z: of('I_z') || of('I_y') };
  return { A, W: { y: Math.sqrt(I.y * A) * 1.1, z: Math.sqrt(I.z * A) * 1.1 } };
}
