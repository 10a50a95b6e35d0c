import type { RefusalItem } from '../engine/refusal';
import { isWellFormed, pointerPart } from './text';

const maxDepth = 24;
const maxItems = 20;
// Tab, newline and carriage return are text; the rest of C0, DEL and C1 are not.
// eslint-disable-next-line no-control-regex -- control characters are what is looked for
const control = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f]/;

function textFault(text: string): Pick<RefusalItem, 'code' | 'message'> | undefined {
  if (!isWellFormed(text))
    return { code: 'not-text', message: 'Holds half of a surrogate pair, which is no character.' };
  if (control.test(text))
    return { code: 'control-character', message: 'Holds a control character.' };
  return undefined;
}

/**
 * What no schema has to think of: numbers too large for a double (JSON's 1e999 reads as infinity),
 * text that is no text, nesting without end.
 */
export function inspect(body: unknown): RefusalItem[] {
  const items: RefusalItem[] = [];
  look(body, '', 0);
  return items;

  function look(value: unknown, pointer: string, depth: number): void {
    if (items.length >= maxItems) return;
    if (typeof value === 'number') {
      if (!Number.isFinite(value))
        items.push({ pointer, code: 'not-finite', message: 'The number is too large.' });
    } else if (typeof value === 'string') {
      const fault = textFault(value);
      if (fault) items.push({ pointer, ...fault });
    } else if (typeof value === 'object' && value !== null) {
      if (depth >= maxDepth) {
        items.push({
          pointer,
          code: 'too-deep',
          message: `Nested deeper than ${maxDepth} levels.`,
        });
      } else if (Array.isArray(value)) {
        value.forEach((item, index) => look(item, `${pointer}/${index}`, depth + 1));
      } else {
        for (const [name, item] of Object.entries(value)) lookAt(name, item, pointer, depth);
      }
    }
  }

  function lookAt(name: string, item: unknown, above: string, depth: number): void {
    const pointer = `${above}/${pointerPart(name)}`;
    const fault = textFault(name);
    if (fault) items.push({ pointer, ...fault });
    else look(item, pointer, depth + 1);
  }
}
