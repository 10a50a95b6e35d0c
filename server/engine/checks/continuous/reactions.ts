import type { BeamFrame } from '../../analysis/beam-frame';
import { toUnit } from '../../units/units';
import type { ReactionAnswer } from '../contract';
import { slotFactors, type SolvedCase } from './solve';

type ByAction = ReactionAnswer['byAction'][number];
type DesignReaction = NonNullable<ReactionAnswer['design']['persistent']>;

interface Range {
  min: number;
  max: number;
  /** The combination that gives the greatest. */
  combination: string;
}

/** The reaction of every support, by action and by design situation, in kN for the whole set. */
export function reactionsOf(frame: BeamFrame, solved: readonly SolvedCase[]): ReactionAnswer[] {
  const byAction = actionRanges(solved, frame.supports.length);
  return Array.from(frame.supports, (x, index) => {
    const range = (situation: string): Range | null =>
      rangeOf(
        solved.filter(({ combination }) => combination.situation === situation),
        index,
      );
    const service = range('serviceability');
    return {
      support: index + 1,
      x: toUnit(x, 'm'),
      byAction: byAction[index] ?? [],
      design: {
        persistent: designOf(range('persistent')),
        accidental: designOf(range('accidental')),
      },
      serviceability: service
        ? { min: toUnit(service.min, 'kN'), max: toUnit(service.max, 'kN') }
        : null,
    };
  });
}

function rangeOf(solved: readonly SolvedCase[], support: number): Range | null {
  let range: Range | null = null;
  for (const { id, state } of solved) {
    const reaction = state?.reactions[support];
    if (reaction === undefined) continue;
    range ??= { min: reaction, max: reaction, combination: id };
    if (reaction < range.min) range.min = reaction;
    if (reaction > range.max) {
      range.max = reaction;
      range.combination = id;
    }
  }
  return range;
}

function designOf(range: Range | null): DesignReaction | null {
  if (!range) return null;
  const { min, max, combination } = range;
  return { min: toUnit(min, 'kN'), max: toUnit(max, 'kN'), combination };
}

/**
 * What each action, as given, puts on each support: over its arrangements, and over the sets of
 * supports that some combination really stands on.
 */
function actionRanges(solved: readonly SolvedCase[], supports: number): ByAction[][] {
  const found = Array.from({ length: supports }, () => new Map<string, ByAction>());
  const seen = new Set<string>();
  for (const { source, arrangement, state, loadSet } of solved) {
    if (!state) continue;
    const key = `${loadSet ?? ''}|${arrangement?.name ?? ''}|${state.acting.join()}`;
    if (seen.has(key)) continue;
    seen.add(key);
    for (const { action } of new Set(source.slots.map((slot) => slot.action))) {
      const factors = slotFactors(source, arrangement, (name) => (name === action.name ? 1 : 0));
      const sums = source.units.supportSums(factors, state.acting);
      if (!sums) continue;
      found.forEach((bySupport, support) => {
        const value = toUnit(sums.reactions[support] ?? 0, 'kN');
        const known = bySupport.get(action.name);
        const { name, nature, category } = action;
        bySupport.set(name, {
          name,
          nature,
          ...(category === undefined ? {} : { category }),
          min: Math.min(value, known?.min ?? value),
          max: Math.max(value, known?.max ?? value),
        });
      });
    }
  }
  return found.map((bySupport) => [...bySupport.values()]);
}
