export type Nature = 'permanent' | 'variable' | 'accidental';
export type Situation = 'persistent' | 'accidental' | 'serviceability';

/** One source of load: all loads of one name, with one factor in each combination. */
export interface Action {
  readonly name: string;
  readonly nature: Nature;
  /** Category of a variable action, which the profile's psi hang on. */
  readonly category?: string;
  /** A permanent action that no arrangement makes favourable: its upper factor alone counts. */
  readonly neverFavourable?: true;
}

/** The factor of an action in a combination; 0 where it does not act. */
export function factorOf({ factors }: Combination, name: string): number {
  // A name such as `toString` must not find what every object has.
  return Object.hasOwn(factors, name) ? (factors[name] ?? 0) : 0;
}

/** One combination of actions: which take part and by which factor. */
export interface Combination {
  readonly situation: Situation;
  /** The expression of EN 1990, or `none` where every value counts once. */
  readonly expression: string;
  readonly leading: string | null;
  /** Factor by action name; an action that is absent does not act. */
  readonly factors: Readonly<Record<string, number>>;
}
