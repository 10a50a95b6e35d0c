import { Op, type WhereOptions } from 'sequelize';
import { decodeTime, isValid } from 'ulid';
import { UsageEvent } from '../../../db/models';
import type { RefusalItem } from '../../engine/refusal';
import { Problem } from '../../middleware/problem';
import type { Query } from '../../middleware/route';
import { pageToken, readPageToken } from './page-token';
import { clientsNamed, namesIn, type Names } from './usage-names';

const day = 86_400_000;
const defaultSize = 100;
const maxSize = 500;
const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;
const plainName = /^[^\p{Cc}]{1,100}$/u;
const selector = /^[0-9A-Za-z]{12}$/;
const reference = /^([a-z0-9]+(?:-[a-z0-9]+)*)(?:@([1-9]\d{0,5}))?$/;
const instant = /^\d{4}-\d\d-\d\d(T\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d))?$/;

/** Names of the parameters of the list; each narrows it. */
export const usageQuery = {
  client: 'text',
  key: 'text',
  person: 'text',
  check: 'text',
  profile: 'text',
  status: 'text',
  answer: ['pass', 'fail', 'incomplete', 'provisional'],
  from: 'text',
  to: 'text',
  pageSize: 'text',
  pageToken: 'text',
} as const;

interface Filters {
  /** Part of the name of the clients meant. */
  readonly clientName: string | undefined;
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

  const client = take('client', 'Must be the id of a client, or part of its name.', (text) =>
    plainName.test(text) ? text : undefined,
  );
  const key = take('key', 'Must be the public part of a key: 12 letters and digits.', (text) =>
    selector.test(text) ? text : undefined,
  );
  const person = take('person', 'Must be the id of a person.', (text) =>
    uuid.test(text) ? text : undefined,
  );
  const profile = take('profile', 'Must be a factor profile, or a revision: uk-na@2.', (text) => {
    const [, slug, revision] = reference.exec(text) ?? [];
    return slug === undefined ? undefined : { slug, revision };
  });
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
    clientName: client === undefined || uuid.test(client) ? undefined : client,
    size: size ?? defaultSize,
    where: {
      ...(client !== undefined && uuid.test(client) && { clientId: client }),
      ...(key !== undefined && { keySelector: key }),
      ...(person !== undefined && { personId: person }),
      ...(profile && { profile: profile.slug }),
      ...(profile?.revision !== undefined && { profileRevision: Number(profile.revision) }),
      ...(check !== undefined && { checkId: check }),
      ...(status !== undefined && { httpStatus: status }),
      ...(query.answer !== undefined && { answer: query.answer }),
      ...(Reflect.ownKeys(at).length > 0 && { at }),
      ...(after !== undefined && { id: { [Op.lt]: after } }),
    },
  };
}

function toCall(row: UsageEvent, { clients, people }: Names) {
  return {
    id: row.id,
    at: row.at,
    phase: row.phase,
    clientId: row.clientId,
    clientName: clients.get(row.clientId ?? '') ?? null,
    keyId: row.keyId,
    keySelector: row.keySelector,
    personId: row.personId,
    personName: people.get(row.personId ?? '') ?? null,
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
  const { where: told, size, clientName } = readFilters(query);
  const named = clientName === undefined ? undefined : await clientsNamed(clientName);
  const where = named ? { [Op.and]: [told, { clientId: { [Op.in]: named } }] } : told;
  const rows = await UsageEvent.findAll({ where, order: [['id', 'DESC']], limit: size + 1 });
  const names = await namesIn(rows);
  const items = rows.slice(0, size).map((row) => toCall(row, names));
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
  return toCall(row, await namesIn([row]));
}
