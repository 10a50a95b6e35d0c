import { editDistance } from '../../engine/text/edit-distance';

const plain = (text: string) => text.toLowerCase().replace(/[^a-z0-9]/g, '');

/**
 * The word of a list that a caller most likely meant: letter case, hyphens and underscores do not
 * count, and up to a third of the letters may be wrong.
 *
 * @example nearest('over_hang', ['overhangs', 'loads']) // 'overhangs'
 */
export function nearest(written: string, words: readonly string[]): string | undefined {
  if (written.length > 60) return undefined;
  const wanted = plain(written);
  const ranked = words
    .map((word) => ({ word, distance: editDistance(wanted, plain(word)) }))
    .sort((a, b) => a.distance - b.distance);
  const [best] = ranked;
  return best && best.distance <= Math.max(1, Math.floor(wanted.length / 3))
    ? best.word
    : undefined;
}
