import type { components } from '@headtree/contract';
import type { Standing } from '../../shared/answer-tag';
import { count } from '../../shared/words';
import type { Page } from '../../core/api/page';

interface Names {
  readonly clientName: string | null;
  readonly personId: string | null;
  readonly personName: string | null;
}

/** A row of the log; its names come with it where the service knows them. */
export type Call = components['schemas']['UsageEvent'] & Partial<Names>;
export type CallPage = Page<Call>;

const answers = new Set(['pass', 'fail', 'incomplete', 'provisional']);

export function standingOf({ answer, httpStatus }: Call): Standing {
  if (answer !== null && answers.has(answer)) return answer as Standing;
  return httpStatus >= 400 ? 'refused' : 'plain';
}

/** The answer's word; a refusal by its status and code. */
export function wordsOf({ answer, httpStatus, code }: Call): string {
  if (answer !== null) return answer;
  return [httpStatus, code].filter((part) => part !== null).join(' ');
}

export const profileOf = ({ profile, profileRevision }: Call): string =>
  profile === null ? '–' : profileRevision === null ? profile : `${profile}@${profileRevision}`;

/** What was asked: the check, or the route where it was none. */
export const askedOf = ({ checkId, route }: Call): string => {
  const place = route.replace(/^\/v1\//, '');
  if (checkId === null) return place;
  const [way = ''] = place.split('/');
  return way === 'checks' ? checkId : `${way} ${checkId}`;
};

/** The client, or who was signed in; null where nobody was known. */
export const callerOf = ({ clientName, clientId, personName, personId }: Call): string | null =>
  clientName ?? clientId ?? personName ?? personId ?? null;

/** `01JD8Q…4F`: enough to tell two calls of one page apart. */
export const shortId = (id: string): string => `${id.slice(0, 6)}…${id.slice(-2)}`;

export const milliseconds = (microseconds: number): string =>
  microseconds < 100_000
    ? (microseconds / 1000).toFixed(1)
    : count(Math.round(microseconds / 1000));

/**
 * What this console itself asked for somebody: no tool's call, and no check. A sign-in that was
 * refused is nobody's, and always worth a look.
 */
export const isConsoles = ({ personId, checkId, route, httpStatus }: Call): boolean =>
  (typeof personId === 'string' && checkId === null) ||
  (route === '/v1/session' && httpStatus < 400);
