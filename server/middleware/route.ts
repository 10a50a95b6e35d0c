import type { Request } from 'express';
import type { Key, Scope } from '../features/keys/key';
import type { KeyKind } from '../features/keys/key-format';
import type { SignedIn } from '../features/people/person';
import type { Permission } from '../features/people/policy';
import type { Call } from './call';

/** Who may call. There is no default: a route that says nothing does not start. */
export type Policy =
  | { readonly kind: 'public' }
  | {
      readonly kind: 'key';
      readonly scope: Scope;
      readonly keyKinds: readonly KeyKind[];
      /** With it somebody who is signed in may call as well, without a key. */
      readonly permission?: Permission;
    }
  | { readonly kind: 'session'; readonly permission: Permission };

/** What a handler gives back; it never writes the response itself. */
export interface Answer {
  readonly status: number;
  /** Sent as JSON; text and bytes are sent as they are, with the type named. */
  readonly body: unknown;
  readonly contentType?: string;
  readonly headers?: Readonly<Record<string, string>>;
}

export type Query = Readonly<Record<string, string | undefined>>;

/** What a handler is given. */
export interface Asked {
  readonly request: Request;
  readonly call: Call;
  /** Present where the call came with a good key. */
  readonly key: Key | undefined;
  /** Present where somebody is signed in and no key was sent. */
  readonly person: SignedIn | undefined;
  readonly params: Readonly<Record<string, string>>;
  readonly query: Query;
  readonly body: unknown;
}

export type Handler = (asked: Asked) => Answer | Promise<Answer>;

/** One row of the route table. */
export interface Route {
  readonly method: 'get' | 'post' | 'patch' | 'delete';
  readonly path: string;
  readonly policy: Policy;
  /** Counted against the caller's limit, or not at all (probes and pages). */
  readonly rate: 'counted' | 'free';
  /** Whether a good answer has its row in the usage log; a refused one under /v1 always has. */
  readonly logged: boolean;
  /** Allowed query parameters with their values, or `text` for any. */
  readonly query?: Readonly<Record<string, 'text' | readonly string[]>>;
  /** For a POST that takes none; whatever is sent is not read. */
  readonly body?: 'none';
  /** The check whose own route it is. */
  readonly check?: string;
  readonly handler: Handler;
}

export const ok = (body: unknown): Answer => ({ status: 200, body });

export const html = (body: string, contentSecurityPolicy: string): Answer => ({
  status: 200,
  body,
  contentType: 'text/html; charset=utf-8',
  headers: { 'Content-Security-Policy': contentSecurityPolicy },
});

/** A list of the API: the token of the next page, or null after the last. */
export const list = (items: readonly unknown[], nextPageToken: string | null = null): Answer =>
  ok({ items, nextPageToken });

const nameOf = ({ method, path }: Route): string => `${method.toUpperCase()} ${path}`;

/**
 * Refuses a table that leaves a door without a lock.
 *
 * @throws when a route has no policy, stands twice, or a check of the registry has no route.
 */
export function assertRoutes(routes: readonly Route[], checkIds: readonly string[]): void {
  const seen = new Set<string>();
  for (const route of routes) {
    const name = nameOf(route);
    if (seen.has(name)) throw new Error(`${name} stands twice in the route table.`);
    seen.add(name);
    assertPolicy(name, route.policy);
  }
  for (const id of checkIds) {
    const own = routes.find(({ check }) => check === id);
    if (own?.policy.kind !== 'key') throw new Error(`The check ${id} has no route with a policy.`);
  }
}

/** The table is typed; this holds for a row that got past the types. */
function assertPolicy(name: string, policy: Policy | undefined): void {
  if (policy?.kind === 'public') return;
  if (policy?.kind === 'session' && policy.permission.length > 0) return;
  if (policy?.kind === 'key' && policy.keyKinds.length > 0 && policy.scope.length > 0) return;
  throw new Error(`${name} has no policy.`);
}
