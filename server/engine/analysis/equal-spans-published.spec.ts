import published from '../../../test/published/actions.json';
import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { greatest, momentExtremes } from './extremes';
import { supportValues } from './values-at';

/** Unit beam of n equal spans under a uniform load of 1. */
function equalSpans(n: number) {
  const load: BeamLoad = { kind: 'distributed', from: 0, to: n, start: 1, end: 1 };
  const beam = new ContinuousBeam(
    {
      spans: Array.from({ length: n }, () => 1),
      overhangs: { start: 0, end: 0 },
      flexuralRigidity: 1,
      supportStiffness: Array.from({ length: n + 1 }, () => null),
    },
    [load],
  );
  const state = beam.solve([load]);
  const spans = bays(state);
  return {
    state,
    spans,
    supports: supportValues(state),
    moments: spans.map((bay) => momentExtremes(state, bay).max),
    deflections: spans.map((bay) => greatest(deflectionExtremes(state, bay))),
  };
}

/** "43/38" or "-1/8" as a number. */
function fraction(text: string): number {
  const [numerator, denominator = 1] = text.split('/').map(Number);
  return numerator! / denominator;
}

/** Equal to the digits that were printed: within half a unit of the last one, and a rounding slip. */
function expectPrinted(value: number, printed: number, slip = 0.5) {
  const digits = String(printed).split('.')[1]?.length ?? 0;
  expect(Math.abs(value - printed)).toBeLessThanOrEqual((0.5 + slip) * 10 ** -digits);
}

const exactTo = (value: number, expected: number) => {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(1e-12);
};

interface EqualSpans {
  id: string;
  inputs: { n: number };
  published: {
    shear_coeff_wL: string[];
    support_moment_coeff_wL2: string[];
    span_moment_coeff_wL2: number[];
    at_xL: (number | null)[];
  };
  recomputed: {
    reactions: string[];
    support_moments: string[];
    span_moment: number[];
    max_deflection_wL4_EI: number[];
    x_of_max_deflection: number[];
  };
}
const cases = (published.examples as { id: string }[]).filter(({ id }) => id.startsWith('W-15'));

describe.each(cases as EqualSpans[])(
  '$id, $inputs.n equal spans under a uniform load',
  (example) => {
    const { supports, moments, deflections } = equalSpans(example.inputs.n);
    const { published, recomputed } = example;

    it('has the published fractions of wL as shears', () => {
      // Listed from the left: end shear, then the larger and smaller side of each support in turn.
      const shears = supports.flatMap(({ left, right }) => [Math.abs(left.V), Math.abs(right.V)]);
      published.shear_coeff_wL.forEach((text, i) => exactTo(shears[i + 1]!, fraction(text)));
    });

    it('has the published fractions of wL² as support moments', () => {
      published.support_moment_coeff_wL2.forEach((text, i) =>
        exactTo(supports[i + 1]!.left.M, -fraction(text)),
      );
      recomputed.support_moments.forEach((text, i) => exactTo(supports[i]!.left.M, fraction(text)));
    });

    it('has the reactions that follow from them', () => {
      recomputed.reactions.forEach((text, i) => exactTo(supports[i]!.reaction, fraction(text)));
    });

    it('has the printed span moments and their places', () => {
      published.span_moment_coeff_wL2.forEach((printed, i) => {
        expectPrinted(moments[i]!.value, printed);
        expectPrinted(moments[i]!.value, recomputed.span_moment[i]!, 0);
        const place = published.at_xL[i];
        if (typeof place === 'number') expectPrinted(moments[i]!.x - i, place);
      });
    });

    it('has the recomputed deflections and their places', () => {
      recomputed.max_deflection_wL4_EI.forEach((printed, i) => {
        expectPrinted(deflections[i]!.value, printed, 0.01);
        expectPrinted(deflections[i]!.x - i, recomputed.x_of_max_deflection[i]!, 0.01);
      });
    });
  },
);

describe.each([
  [4, '11/28 17/28 15/28 13/28', '3/28 2/28', [0.0772, 0.0364]],
  [6, '41/104 63/104 55/104 49/104 51/104 53/104', '11/104 8/104 9/104', [0.0777, 0.034, 0.0433]],
] as const)(
  '%i equal spans, from the same published table',
  (n, shears, supportMoments, inSpan) => {
    const { supports, moments } = equalSpans(n);

    it('has the published fractions and printed span moments', () => {
      const sides = supports.flatMap(({ left, right }) => [Math.abs(left.V), Math.abs(right.V)]);
      shears.split(' ').forEach((text, i) => exactTo(sides[i + 1]!, fraction(text)));
      supportMoments
        .split(' ')
        .forEach((text, i) => exactTo(supports[i + 1]!.left.M, -fraction(text)));
      inSpan.forEach((printed, i) => expectPrinted(moments[i]!.value, printed));
    });
  },
);

describe('W-16, propped cantilever: half of two equal spans', () => {
  const { moments, deflections } = equalSpans(2);
  const example = published.examples.find(({ id }) => id === 'W-16') as unknown as {
    published: { M_span: number; x_defl: number; defl: number };
    recomputed: { defl: number };
  };

  it('has 9/128 WL in the span', () => {
    exactTo(moments[0]!.value, example.published.M_span);
    exactTo(moments[0]!.x, 3 / 8);
  });

  it('deflects most at 0.4215 L: (1 + √33)/16', () => {
    expectPrinted(deflections[0]!.x, example.published.x_defl, 0);
    exactTo(deflections[0]!.x, (1 + Math.sqrt(33)) / 16);
    expectPrinted(deflections[0]!.value, example.published.defl, 0);
    expectPrinted(deflections[0]!.value, example.recomputed.defl, 0);
  });
});
