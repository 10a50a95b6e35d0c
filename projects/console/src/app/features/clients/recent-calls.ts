import type { Call } from '../usage/call';

export interface RecentCalls {
  readonly calls: number;
  /** The newest one. */
  readonly last: string;
}

/** What each client did in the loaded part of the log. */
export function recentByClient(newestFirst: readonly Call[]): ReadonlyMap<string, RecentCalls> {
  const found = new Map<string, RecentCalls>();
  for (const { clientId, at, repeats } of newestFirst) {
    if (clientId === null) continue;
    const { calls, last } = found.get(clientId) ?? { calls: 0, last: at };
    found.set(clientId, { calls: calls + repeats, last });
  }
  return found;
}
