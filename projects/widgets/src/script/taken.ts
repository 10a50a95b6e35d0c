import { version } from './version';

const warned = new Set<string>();

/**
 * Whether the page has an element of this name already. A second copy of the script leaves the
 * first alone: it says so once and does nothing.
 */
export function isTaken(name: string): boolean {
  const first = customElements.get(name);
  if (!first) return false;
  const maker = makerOf(first);
  // Another copy has them all: once is enough.
  if (!warned.has(maker)) {
    warned.add(maker);
    console.warn(
      `Headtree elements ${version}: <${name}> is defined already, by ${maker}. ` +
        'The first stays in use; load the script once.',
    );
  }
  return true;
}

function makerOf(element: CustomElementConstructor): string {
  const { headtreeVersion } = element as { headtreeVersion?: unknown };
  return typeof headtreeVersion === 'string'
    ? `Headtree elements ${headtreeVersion}`
    : 'another script';
}
