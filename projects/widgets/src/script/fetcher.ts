import type { Fetcher } from '@headtree/checks';

/** Any page may read it, whatever its origin. */
const OPEN = '/elements/v1/custom-elements.json';

/**
 * Tells a service that is away from one that refuses the page. A browser hides from a page of an
 * origin that is on no page key's list all that the service says, so both look alike to it: but
 * when an open file is answered and the call fails again, it is the origin.
 */
export const fetchOrSayWhy: Fetcher = async (url, init) => {
  try {
    return await fetch(url, init);
  } catch (error) {
    if (init.signal?.aborted || !(await isThere(url))) throw error;
  }
  try {
    return await fetch(url, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    return refusal();
  }
};

async function isThere(url: string): Promise<boolean> {
  try {
    const open = new URL(OPEN, new URL(url, location.href));
    return (await fetch(open, { cache: 'no-store', credentials: 'omit' })).ok;
  } catch {
    return false;
  }
}

/** In the words of the service's own problem of this kind. */
function refusal(): Response {
  const detail =
    `The service refuses this page: its origin ${location.origin} is on the list of no page key. ` +
    'Ask the administrator to add it to the key.';
  const problem = { code: 'origin-not-allowed', detail, errors: [] };
  return new Response(JSON.stringify(problem), {
    status: 403,
    headers: { 'Content-Type': 'application/problem+json' },
  });
}
