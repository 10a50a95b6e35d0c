import type { RefusalItem } from '../../engine/refusal';
import { scopes, type Scope } from '../keys/key';
import { originFault } from './origin';

/** What an administrator asks of a new key. */
export interface KeyRequest {
  readonly kind: 'secret' | 'page';
  readonly label: string;
  readonly scopes?: readonly Scope[];
  readonly origins?: readonly string[];
  readonly profiles?: readonly string[] | null;
  readonly rateLimit?: number | null;
  readonly expiresAt?: string | null;
}

/** What a key of a kind may do at most, and does where nothing is said; never the log. */
const allowed = { secret: scopes, page: ['checks', 'catalogue'] } as const satisfies Readonly<
  Record<KeyRequest['kind'], readonly Scope[]>
>;
const usual: readonly Scope[] = ['checks', 'catalogue'];

export const scopesOf = ({ scopes: asked }: KeyRequest): readonly Scope[] => asked ?? usual;

const instant = /^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d)$/;

/** What the contract's schema cannot say of a key. */
export function keyFaults(
  request: KeyRequest,
  knownProfiles: readonly string[],
  now: Date,
): RefusalItem[] {
  return [
    ...scopeFaults(request),
    ...originFaults(request),
    ...profileFaults(request, knownProfiles),
    ...expiryFaults(request, now),
  ];
}

function scopeFaults(request: KeyRequest): RefusalItem[] {
  const may: readonly Scope[] = allowed[request.kind];
  return scopesOf(request).flatMap((scope, index) =>
    may.includes(scope)
      ? []
      : [
          {
            pointer: `/scopes/${index}`,
            code: 'scope-not-allowed',
            message: `A ${request.kind} key cannot have the scope "${scope}".`,
            fix: `Take some of: ${may.join(', ')}.`,
          },
        ],
  );
}

function originFaults({ kind, origins = [] }: KeyRequest): RefusalItem[] {
  const pointer = '/origins';
  if (kind === 'secret') {
    const message = 'A secret key is used from no page, so it has no origins.';
    const fix = 'Leave `origins` out, or issue a page key.';
    return origins.length === 0 ? [] : [{ pointer, code: 'not-for-kind', message, fix }];
  }
  if (origins.length === 0) {
    const message = 'A page key needs at least one origin: without one no page could use it.';
    const fix = 'Name each page’s scheme, host and port: "https://intranet.example".';
    return [{ pointer, code: 'missing-field', message, fix }];
  }
  return origins.flatMap((origin, index) => originFault(origin, `${pointer}/${index}`) ?? []);
}

function profileFaults({ profiles }: KeyRequest, known: readonly string[]): RefusalItem[] {
  return (profiles ?? []).flatMap((slug, index) =>
    known.includes(slug)
      ? []
      : [
          {
            pointer: `/profiles/${index}`,
            code: 'unknown',
            message: 'There is no such factor profile.',
            fix: `There are: ${known.join(', ')}.`,
          },
        ],
  );
}

function expiryFaults({ expiresAt }: KeyRequest, now: Date): RefusalItem[] {
  if (expiresAt === undefined || expiresAt === null) return [];
  const pointer = '/expiresAt';
  const time = instant.test(expiresAt) ? Date.parse(expiresAt) : Number.NaN;
  if (Number.isNaN(time)) {
    const message = 'Must be a date and time with its offset: 2027-01-31T18:00:00Z.';
    return [{ pointer, code: 'wrong-form', message }];
  }
  if (time > now.getTime()) return [];
  return [{ pointer, code: 'past', message: 'The key would have expired before it is issued.' }];
}
