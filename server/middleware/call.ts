import type { Request, Response } from 'express';
import { performance } from 'node:perf_hooks';
import { decodeTime } from 'ulid';
import type { Key } from '../features/keys/key';
import type { SignedIn } from '../features/people/person';
import { nextId } from './ids';
import type { ProblemCode } from './problem-codes';

const plainLabel = /^[\w.:/+=@,-]{1,100}$/;
const keyInside = /ht[kpc]_[0-9A-Za-z]{12}_/;

/** What the handler of a call has to say to the log. */
export interface Facts {
  readonly checkId?: string;
  readonly profile?: string;
  readonly profileRevision?: number;
  readonly answer?: string;
  readonly utilisation?: number | null;
  readonly governing?: string | null;
  readonly items?: number;
}

/** What is known of one request on its way. */
export class Call {
  /** Ours, unique, with the time in it: the log is pruned by it. */
  readonly id: string;
  readonly at: Date;
  readonly callerRequestId: string | undefined;
  readonly origin: string | undefined;
  readonly ownOrigin: boolean;
  /** Path of the route as written in the route table, never the caller's own. */
  route = 'none';
  /** Whether a good answer without a key has a row too; all under /v1 that is refused has one. */
  logged: 'always' | 'refused' | 'never' = 'never';
  key: Key | undefined;
  /** Why the key that was sent does not hold. */
  refusedKey: ProblemCode | undefined;
  /** Public part of the key that was sent, good or not. */
  keySelector: string | undefined;
  /** Owner of a key that no longer holds; for the log. */
  formerKey: Key | undefined;
  /** Who is signed in; never beside a key. */
  person: SignedIn | undefined;
  facts: Facts = {};
  private readonly started = performance.now();

  constructor(request: Request) {
    this.id = nextId();
    // Not the clock again: within one millisecond, or after a step back, the id keeps its own.
    this.at = new Date(decodeTime(this.id));
    this.callerRequestId = labelOf(request.headers['x-request-id']);
    this.origin = originOf(request);
    this.ownOrigin = this.origin !== undefined && hostOf(this.origin) === request.headers.host;
  }

  /** What a handler knows goes into the row of the call, whatever comes of the call. */
  note(facts: Facts): void {
    this.facts = { ...this.facts, ...facts };
  }

  /** Whether an answer of this status has its row in the usage log. */
  isLogged(status: number): boolean {
    if (this.logged === 'never') return false;
    return this.logged === 'always' || status >= 400 || this.key !== undefined;
  }

  get microseconds(): number {
    return Math.round((performance.now() - this.started) * 1_000);
  }
}

/** A caller's own id is kept as a label when it is well formed and holds no key. */
function labelOf(given: string | string[] | undefined): string | undefined {
  if (typeof given !== 'string' || !plainLabel.test(given) || keyInside.test(given))
    return undefined;
  return given;
}

/** Browsers name no origin on a GET to the page's own; Sec-Fetch-Site tells that case. */
function originOf(request: Request): string | undefined {
  const { origin, host } = request.headers;
  if (origin !== undefined) return origin;
  if (request.headers['sec-fetch-site'] !== 'same-origin' || host === undefined) return undefined;
  return `${request.protocol}://${host}`;
}

function hostOf(origin: string): string | undefined {
  return URL.canParse(origin) ? new URL(origin).host : undefined;
}

export const callOf = (response: Response): Call => response.locals.call as Call;
