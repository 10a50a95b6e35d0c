import { Refusal } from '../refusal';
import type { ProfileRevision } from './profile';
import type { ProfileTree, ProfileValue } from './tree';

/** A recalled value that a check read and nobody has confirmed yet. */
export interface Unconfirmed {
  readonly path: string;
  readonly value: number | string;
  readonly clause: string;
}

export function isProfileValue(node: ProfileTree | ProfileValue): node is ProfileValue {
  return typeof node.kind === 'string' && 'value' in node;
}

/** The leaf at a path such as `steel.gamma_M0`, if the tree has one there. */
export function findValue(tree: ProfileTree, path: string): ProfileValue | undefined {
  let node: ProfileTree | ProfileValue | undefined = tree;
  for (const name of path.split('.')) {
    if (node === undefined || isProfileValue(node)) return undefined;
    node = Object.hasOwn(node, name) ? node[name] : undefined;
  }
  return node !== undefined && isProfileValue(node) ? node : undefined;
}

/**
 * Reads a profile for one check and records what was really read: only that can make an answer
 * provisional.
 */
export class ProfileReader {
  private readonly read = new Map<string, ProfileValue>();

  constructor(readonly revision: ProfileRevision) {}

  /** @throws {Refusal} `profile-value-missing` where the profile does not hold the value. */
  leaf(path: string): ProfileValue {
    const known = this.read.get(path);
    if (known) return known;
    const found = findValue(this.revision.tree, path);
    if (!found) {
      throw this.refusal('profile-value-missing', `The profile holds no ${path}.`);
    }
    this.read.set(path, found);
    return found;
  }

  number(path: string): number {
    const { value } = this.leaf(path);
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      throw this.refusal('profile-value-unusable', `${path} of the profile is no number.`);
    }
    return value;
  }

  /** @throws {Refusal} `profile-value-unusable` where the profile's choice is none of `options`. */
  choice<T extends string>(path: string, options: readonly T[]): T {
    const { value } = this.leaf(path);
    const chosen = options.find((option) => option === value);
    if (chosen === undefined) {
      throw this.refusal(
        'profile-value-unusable',
        `${path} of the profile is none of ${options.join(', ')}.`,
      );
    }
    return chosen;
  }

  has(path: string): boolean {
    return findValue(this.revision.tree, path) !== undefined;
  }

  /** Records a tabulated value that a choice of the profile led to. */
  record(path: string, value: ProfileValue): void {
    this.read.set(path, value);
  }

  unconfirmed(): Unconfirmed[] {
    return [...this.read]
      .filter(([, leaf]) => leaf.kind === 'recalled' && leaf.confirmedBy === undefined)
      .map(([path, { value, clause }]) => ({ path, value, clause }));
  }

  private refusal(code: string, message: string): Refusal {
    const { slug, revision } = this.revision;
    return new Refusal(code, `${message} (${slug}@${revision})`, [
      { pointer: '/profile', code, message },
    ]);
  }
}
