/** A value of a profile as the service sends it. */
export interface ProfileValue {
  readonly value: number | string;
  readonly unit: string;
  readonly clause: string;
  readonly source: string;
  readonly locator?: string;
  readonly kind: string;
  readonly confirmedBy?: string;
  readonly note?: string;
}

/** A value with its place in the tree. */
export interface PlacedValue extends ProfileValue {
  /** Whole path, parts joined by a dot. */
  readonly path: string;
  /** The path without its first part, which heads the branch. */
  readonly name: string;
}

export interface Branch {
  readonly name: string;
  readonly values: readonly PlacedValue[];
}

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const isValue = (node: unknown): node is ProfileValue =>
  isObject(node) && 'value' in node && !isObject(node.value) && typeof node.kind === 'string';

function valuesUnder(node: unknown, parts: readonly string[]): PlacedValue[] {
  if (isValue(node))
    return [{ ...node, path: parts.join('.'), name: parts.slice(1).join('.') || (parts[0] ?? '') }];
  if (!isObject(node)) return [];
  return Object.entries(node).flatMap(([name, each]) => valuesUnder(each, [...parts, name]));
}

/** The tree as its first branches, each with every value below it in the tree's order. */
export const branchesOf = (tree: unknown): Branch[] =>
  isObject(tree)
    ? Object.entries(tree).map(([name, node]) => ({ name, values: valuesUnder(node, [name]) }))
    : [];

/** From memory, and no published example that was read uses it: whoever uses it is told. */
export const isUnconfirmed = ({ kind, confirmedBy }: ProfileValue): boolean =>
  kind === 'recalled' && confirmedBy === undefined;

const kindWords: Readonly<Record<string, string>> = {
  sourced: 'read in the source',
  derived: 'derived',
  bound: 'safe end of the range',
  'common-practice': 'common practice',
  firm: 'the firm’s own rule',
};

/** How the value is known. */
export const knownBy = ({ kind, confirmedBy }: ProfileValue): string => {
  if (kind !== 'recalled') return kindWords[kind] ?? kind;
  return confirmedBy === undefined
    ? 'from memory, unconfirmed'
    : `from memory, confirmed by ${confirmedBy}`;
};

/** Source and place in it; a value from memory has none. */
export const readIn = ({ kind, source, locator }: ProfileValue): string =>
  kind === 'recalled' ? '–' : [source, locator].filter(Boolean).join(', ');
