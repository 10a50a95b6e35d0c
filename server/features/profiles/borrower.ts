import type { Asked } from '../../middleware/route';
import type { Key } from '../keys/key';

/** What a caller may use of the factor profiles, and what stands in for what it leaves out. */
export type Borrower = Pick<Key, 'profiles' | 'defaultProfile' | 'pins'>;

/** Somebody who is signed in may use every profile and has to name it. */
const signedIn: Borrower = { profiles: null, defaultProfile: null, pins: {} };

/** The key of the call, or the person's rights. */
export function borrowerOf({ key, person }: Pick<Asked, 'key' | 'person'>): Borrower {
  if (key) return key;
  if (person) return signedIn;
  throw new Error('This route has no policy that wants a key or a person.');
}
