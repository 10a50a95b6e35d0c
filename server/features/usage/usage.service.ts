import { Op, type WhereOptions } from 'sequelize';
import { decodeTime, isValid } from 'ulid';
import { UsageEvent } from '../../../db/models';
import type { RefusalItem } from '../../engine/refusal';
import { Problem } from '../../middleware/problem';
import type { Query } from '../../middleware/route';
import { pageToken, readPageToken } from './page-token';

const day = 86_400_000;
const defaultSize = 100;
const maxSize = 500;
const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;
const instant = /^\d{4}-\d\d-\d\d(T\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d))?$/;

/** Names of the parameters of the list; each narrows it. */
export const usageQuery = {
  client: 'text',
  check: 'text',
  status: 'text',
  answer: ['pass', 'fail', 'incomplete', 'provisional'],
  from: 'text',
  to: 'text',
  pageSize: 'text',
  pageToken: 'text',
} as const;

interface Filters {
  readonly where: WhereOptions<UsageEvent>;
  readonly size: number;
}

function readFilters(query: Query): Filters {
  const errors: RefusalItem[] = [];
  const take = <T>(name: string, message: string, read: (text: string) => T | undefined) => {
    const text = query[name];
    if (text === undefined) return undefined;
    const value = read(text);
    if (value === undefined) errors.push({ pointer: `/query/${name}`, code: 'value', message });
    return value;
  };
  const whole = (text: string, low: number, high: number): number | undefined =>
    /^\d{1,4}$/.test(text) && Number(text) >= low && Number(text) <= high
      ? Number(text)
      : undefined;
  const time = (text: string): Date | undefined =>
    instant.test(text) && !Number.isNaN(Date.parse(text)) ? new Date(text) : undefined;
  const moment = 'Must be a date, or a date and time with its offset: 2026-01-31T08:00:00Z.';

  const client = take('client', 'Must be the id of a client.', (text) =>
    uuid.test(text) ? text : undefined,
  );
  const check = take('check', 'Must be the id of a check.', (text) =>
    /^[a-z-]{1,40}$/.test(text) ? text : undefined,
  );
  const status = take('status', 'Must be an HTTP status.', (text) => whole(text, 100, 599));
  const from = take('from', moment, time);
  const to = take('to', moment, time);
  const size = take('pageSize', `Must be 1 to ${maxSize}.`, (text) => whole(text, 1, maxSize));
  const after = take('pageToken', 'Not a token of this list.', readPageToken);
  if (errors.length > 0)
    throw new Problem('query-not-valid', 'The query is not valid.', { errors });

  const at = {
    ...(from && { [Op.gte]: from }),
    ...(to && { [Op.lt]: to }),
    // The time in the id says in which partitions the next page can be.
    ...(after !== undefined && { [Op.lte]: new Date(decodeTime(after)) }),
  };
  return {
    size: size ?? defaultSize,
    where: {
      ...(client !== undefined && { clientId: client }),
      ...(check !== undefined && { checkId: check }),
      ...(status !== undefined && { httpStatus: status }),
      ...(query.answer !== undefined && { answer: query.answer }),
      ...(Reflect.ownKeys(at).length > 0 && { at }),
      ...(after !== undefined && { id: { [Op.lt]: after } }),
    },
  };
}

function toCall(row: UsageEvent) {
  return {
    id: row.id,
    at: row.at,
    phase: row.phase,
    clientId: row.clientId,
    keyId: row.keyId,
    keySelector: row.keySelector,
    method: row.method,
    route: row.route,
    checkId: row.checkId,
    profile: row.profile,
    profileRevision: row.profileRevision,
    httpStatus: row.httpStatus,
    code: row.code,
    answer: row.answer,
    utilisation: row.utilisation,
    governing: row.governing,
    items: row.items,
    durationUs: row.durationUs,
    address: row.address,
    origin: row.origin,
    callerRequestId: row.callerRequestId,
    repeats: row.repeats,
  };
}

export type LoggedCall = ReturnType<typeof toCall>;

/** Newest first, by keyset: a page costs the same however far back it lies. */
export async function listUsage(
  query: Query,
): Promise<{ items: LoggedCall[]; nextPageToken: string | null }> {
  const { where, size } = readFilters(query);
  const rows = await UsageEvent.findAll({ where, order: [['id', 'DESC']], limit: size + 1 });
  const items = rows.slice(0, size).map(toCall);
  const last = items.at(-1);
  return { items, nextPageToken: rows.length > size && last ? pageToken(last.id) : null };
}

/** One call by the id that its answer carried. */
export async function findCall(id: string): Promise<LoggedCall> {
  const time = isValid(id) ? decodeTime(id) : undefined;
  // An end row is of the same id and comes later: the last one tells how the call went.
  const rows =
    time === undefined
      ? []
      : await UsageEvent.findAll({
          where: { id, at: { [Op.between]: [new Date(time), new Date(time + day)] } },
          order: [['at', 'DESC']],
          limit: 1,
        });
  const [row] = rows;
  if (!row) throw new Problem('not-found', 'There is no call of this id.');
  return toCall(row);
}
