import type { SectionRequest } from '../../server/engine/checks/contract';
import { section } from '../../server/engine/checks/section/section';
import { Refusal } from '../../server/engine/refusal';
import { publishedRevision } from '../../server/engine/testing/profiles';
import { callScript } from '../support/script';

interface Expected {
  readonly resistance: number;
  readonly utilisation: number | null;
}

interface Case {
  readonly request: SectionRequest;
  readonly expected:
    | { readonly refused: true }
    | { readonly refused: false; readonly verifications: Record<string, Expected> };
}

/** Sections at random, checked by the engine and by a script that was written apart from it. */
const COUNT = Number(process.env.HEADTREE_REFERENCE_COUNT ?? 500);

/** The script integrates outlines, the engine has closed formulas: what rounding leaves. */
const TOLERANCE = 1e-9;

let cases: readonly Case[] = [];
beforeAll(async () => {
  const outcome = await callScript('reference/reference.mjs', 'casesAtRandom', COUNT);
  if (!('value' in outcome)) throw new Error('the reference script stopped');
  cases = outcome.value as Case[];
}, 120_000);

const profile = publishedRevision('en-recommended');

function answered(request: SectionRequest): Record<string, Expected> | Refusal {
  try {
    const { verifications } = section.run(request, { profile, detail: 'summary' });
    return Object.fromEntries(
      verifications.map(({ id, resistance, utilisation }) => [
        id,
        { resistance: resistance.value, utilisation },
      ]),
    );
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
}

/** Relative difference; both without a utilisation are the same. */
function apart(ours: number | null, theirs: number | null): number {
  const [a, b] = [ours ?? 0, theirs ?? 0];
  if (a === b) return 0;
  return Math.abs(a - b) / Math.max(Math.abs(a), Math.abs(b));
}

test(`class, N, M, V and 6.2.8 to 6.2.10 of ${COUNT} sections agree with the reference`, () => {
  const worst: Record<string, number> = {};
  const differing: unknown[] = [];
  let compared = 0;
  let refused = 0;
  for (const { request, expected } of cases) {
    const ours = answered(request);
    if (expected.refused || ours instanceof Refusal) {
      refused += 1;
      // The reference refuses a slender tube whatever acts, the engine not under tension alone.
      if (ours instanceof Refusal) expect([ours.code, expected.refused]).toEqual(['class-4', true]);
      continue;
    }
    expect(Object.keys(ours).sort()).toEqual(Object.keys(expected.verifications).sort());
    for (const [id, theirs] of Object.entries(expected.verifications)) {
      const gap = Math.max(
        apart(ours[id]?.utilisation ?? null, theirs.utilisation),
        theirs.utilisation === null ? 0 : apart(ours[id]?.resistance ?? null, theirs.resistance),
      );
      if (gap > TOLERANCE) differing.push({ id, gap, request });
      worst[id] = Math.max(worst[id] ?? 0, gap);
      compared += 1;
    }
  }
  expect(differing).toEqual([]);
  expect(compared).toBeGreaterThan(4 * (COUNT - refused));
  console.info(
    `${compared} verifications compared, ${refused} refused; worst ratio less 1:`,
    worst,
  );
});
