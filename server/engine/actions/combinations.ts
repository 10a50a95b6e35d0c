import type { ProfileReader } from '../profiles/reader';
import { Refusal } from '../refusal';
import type { Action, Combination, Situation } from './action';

/** Sources of each nature that one request may name (contract, section 1). */
export const MOST_ACTIONS = 6;

/**
 * Every combination of EN 1990 6.4.3.2 and 6.4.3.3 and 6.5.3(2)a that the actions allow: permanent
 * actions each by their upper or lower factor, every subset of the variable actions, each of the
 * subset leading in turn. Combinations with the same factors are given once.
 *
 * @throws {Refusal} where an action that needs psi has no category that the profile knows.
 */
export function combine(
  actions: readonly Action[],
  situation: Situation,
  profile: ProfileReader,
): Combination[] {
  const permanent = actions.filter(({ nature }) => nature === 'permanent');
  const variable = actions.filter(({ nature }) => nature === 'variable');
  const accidental = actions.filter(({ nature }) => nature === 'accidental');
  if (situation === 'serviceability') {
    return distinct(
      variableParts(variable, () => 1, psiOf(profile, 'psi_0')).map((part) => ({
        situation,
        expression: 'EN 1990 (6.14b)',
        leading: part.leading,
        factors: { ...allBy(permanent, 1), ...part.factors },
      })),
    );
  }
  if (situation === 'accidental') {
    const leading = profile.choice('combinations.accidentalLeading', ['psi_1', 'psi_2']);
    const parts = variableParts(variable, psiOf(profile, leading), psiOf(profile, 'psi_2'));
    return distinct(
      accidental.flatMap((action) =>
        parts.map((part) => ({
          situation,
          expression: 'EN 1990 (6.11b)',
          leading: part.leading,
          factors: { ...allBy(permanent, 1), [action.name]: 1, ...part.factors },
        })),
      ),
    );
  }
  return distinct(strengthCombinations(permanent, variable, profile));
}

/**
 * Every value of the caller counts once, by 1; a variable action may be absent. What the service
 * adds itself, being characteristic, has its upper factor in a strength situation.
 */
export function uncombined(
  actions: readonly Action[],
  situation: Situation,
  profile: ProfileReader,
): Combination[] {
  const variable = actions.filter(({ nature }) => nature === 'variable');
  const lasting = Object.fromEntries(
    actions
      .filter(({ nature }) => nature !== 'variable')
      .map(({ name, neverFavourable }) => [
        name,
        neverFavourable && situation === 'persistent'
          ? profile.number('combinations.gamma_G_sup')
          : 1,
      ]),
  );
  const one = (): number => 1;
  return distinct(
    variableParts(variable, one, one).map((part) => ({
      situation,
      expression: 'none',
      leading: null,
      factors: { ...lasting, ...part.factors },
    })),
  );
}

interface Expression {
  readonly name: string;
  /** Multiplies the upper factor of permanent actions. */
  readonly reduction: number;
  /** Whether the leading variable action is reduced by psi_0 too. */
  readonly leadingReduced: boolean;
}

function strengthCombinations(
  permanent: readonly Action[],
  variable: readonly Action[],
  profile: ProfileReader,
): Combination[] {
  const upper = profile.number('combinations.gamma_G_sup');
  const lower = profile.number('combinations.gamma_G_inf');
  const gamma_Q = variable.length > 0 ? profile.number('combinations.gamma_Q') : 0;
  const psi_0 = psiOf(profile, 'psi_0');
  return expressionsOf(profile).flatMap((expression) => {
    const accompanying = (action: Action): number => gamma_Q * psi_0(action);
    const leading = expression.leadingReduced ? accompanying : () => gamma_Q;
    const variableFactors = variableParts(variable, leading, accompanying);
    return permanentParts(permanent, upper * expression.reduction, lower).flatMap((fixed) =>
      variableFactors.map((part) => ({
        situation: 'persistent' as const,
        expression: `EN 1990 (${expression.name})`,
        leading: part.leading,
        factors: { ...fixed, ...part.factors },
      })),
    );
  });
}

function expressionsOf(profile: ProfileReader): Expression[] {
  const choice = profile.choice('combinations.strength', ['6.10', '6.10a/b']);
  if (choice === '6.10') return [{ name: '6.10', reduction: 1, leadingReduced: false }];
  return [
    { name: '6.10a', reduction: 1, leadingReduced: true },
    { name: '6.10b', reduction: profile.number('combinations.xi'), leadingReduced: false },
  ];
}

/** Each permanent action by its upper or its lower factor, independently of the others. */
function permanentParts(
  permanent: readonly Action[],
  upper: number,
  lower: number,
): Record<string, number>[] {
  return permanent.reduce<Record<string, number>[]>(
    (parts, { name, neverFavourable }) =>
      parts.flatMap((part) => {
        const unfavourable = { ...part, [name]: upper };
        return neverFavourable ? [unfavourable] : [unfavourable, { ...part, [name]: lower }];
      }),
    [{}],
  );
}

interface VariablePart {
  readonly leading: string | null;
  readonly factors: Record<string, number>;
}

/** Every subset of the variable actions, each member leading in turn, and none at all. */
function variableParts(
  variable: readonly Action[],
  leadingFactor: (action: Action) => number,
  accompanyingFactor: (action: Action) => number,
): VariablePart[] {
  const parts: VariablePart[] = [{ leading: null, factors: {} }];
  for (let mask = 1; mask < 2 ** variable.length; mask += 1) {
    const subset = variable.filter((_, index) => (mask & (1 << index)) !== 0);
    for (const leading of subset) {
      const factors: Record<string, number> = {};
      for (const action of subset) {
        factors[action.name] =
          action === leading ? leadingFactor(action) : accompanyingFactor(action);
      }
      parts.push({ leading: leading.name, factors });
    }
  }
  return parts;
}

function psiOf(
  profile: ProfileReader,
  which: 'psi_0' | 'psi_1' | 'psi_2',
): (action: Action) => number {
  return ({ name, category }) => {
    if (category === undefined || !profile.has(`psi.${category}.${which}`)) {
      throw unknownCategory(name, category, profile);
    }
    return profile.number(`psi.${category}.${which}`);
  };
}

function unknownCategory(
  name: string,
  category: string | undefined,
  profile: ProfileReader,
): Refusal {
  const known = Object.keys(profile.revision.tree.psi ?? {}).join(', ');
  const code = category === undefined ? 'category-required' : 'unknown-category';
  const message =
    category === undefined
      ? `The variable action "${name}" needs a category for its combination factor; the profile knows ${known}.`
      : `The profile holds no combination factor for the category "${category}" of "${name}"; it knows ${known}.`;
  return new Refusal(code, message, [
    { pointer: '/loads', code, message, clause: 'EN 1990 Table A1.1' },
  ]);
}

function allBy(actions: readonly Action[], factor: number): Record<string, number> {
  return Object.fromEntries(actions.map(({ name }) => [name, factor]));
}

function distinct(combinations: readonly Combination[]): Combination[] {
  const seen = new Map<string, Combination>();
  for (const combination of combinations) {
    const key = JSON.stringify(Object.entries(combination.factors).sort());
    if (!seen.has(key)) seen.set(key, combination);
  }
  return [...seen.values()];
}
