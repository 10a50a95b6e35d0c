import type { Key } from '../features/keys/key';
import type { Asked } from './route';

/** The key of a call whose policy wants one. */
export function keyOf({ key }: Asked): Key {
  if (!key) throw new Error('This route has no policy that wants a key.');
  return key;
}
