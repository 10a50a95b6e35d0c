import { Refusal } from '../refusal';

/** A refusal about one place of the request. */
export function refuse(code: string, pointer: string, message: string, clause?: string): never {
  const item = { pointer, code, message };
  throw new Refusal(code, message, [clause === undefined ? item : { ...item, clause }]);
}

/** What the contract has and this version of a check does not make yet: refused, never passed over. */
export function notCovered(pointer: string, what: string, clause: string): never {
  return refuse(
    'not-covered',
    pointer,
    `${what} is not covered by this version of the check.`,
    clause,
  );
}
