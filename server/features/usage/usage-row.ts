import type { Call } from '../../middleware/call';
import { wellFormed } from '../../middleware/text';

/** A row of `usage_events`, by the names of its columns. */
export interface UsageRow {
  readonly id: string;
  readonly at: Date;
  readonly phase: 'whole' | 'start' | 'end';
  readonly client_id: string | null;
  readonly key_id: string | null;
  readonly key_selector: string | null;
  readonly person_id: string | null;
  readonly method: string;
  readonly route: string;
  readonly check_id: string | null;
  readonly profile: string | null;
  readonly profile_revision: number | null;
  readonly http_status: number;
  readonly code: string | null;
  readonly answer: string | null;
  readonly utilisation: number | null;
  readonly governing: string | null;
  readonly items: number | null;
  readonly duration_us: number;
  readonly address: string | null;
  readonly origin: string | null;
  readonly caller_request_id: string | null;
  readonly repeats: number;
}

const keyText = /(ht[kpc]_[0-9A-Za-z]{12}_)[0-9A-Za-z]+/g;

/** A caller's text as the log may hold it: short, printable, without a secret. */
export function loggable(text: string | undefined | null, length = 200): string | null {
  if (text === undefined || text === null) return null;
  const printable = wellFormed(text).replace(/\p{Cc}/gu, ' ');
  return wellFormed(printable.replace(keyText, '$1…').slice(0, length));
}

export interface Ending {
  readonly method: string;
  readonly status: number;
  readonly code: string | null;
  readonly address: string | null;
}

export function usageRow(call: Call, ending: Ending): UsageRow {
  const owner = call.key ?? call.formerKey;
  const { facts } = call;
  return {
    id: call.id,
    at: call.at,
    phase: 'whole',
    client_id: owner?.clientId ?? null,
    key_id: owner?.id ?? null,
    key_selector: call.keySelector ?? null,
    person_id: call.person?.id ?? null,
    method: ending.method,
    route: call.route,
    check_id: facts.checkId ?? null,
    profile: loggable(facts.profile),
    profile_revision: facts.profileRevision ?? null,
    http_status: ending.status,
    code: ending.code,
    answer: facts.answer ?? null,
    utilisation: facts.utilisation ?? null,
    governing: facts.governing ?? null,
    items: facts.items ?? null,
    duration_us: Math.min(call.microseconds, 2_147_483_647),
    address: ending.address,
    origin: loggable(call.origin),
    caller_request_id: loggable(call.callerRequestId),
    repeats: 1,
  };
}
