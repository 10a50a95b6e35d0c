import { col, fn, Op, where } from 'sequelize';
import { Client, User, type UsageEvent } from '../../../db/models';

/** Names for the ids that the log keeps. */
export interface Names {
  readonly clients: ReadonlyMap<string, string>;
  readonly people: ReadonlyMap<string, string>;
}

const distinct = (ids: readonly (string | null)[]): string[] => [
  ...new Set(ids.filter((id) => id !== null)),
];

const byId = (rows: readonly { id: string; name: string }[]): ReadonlyMap<string, string> =>
  new Map(rows.map(({ id, name }) => [id, name]));

export async function namesIn(
  rows: readonly Pick<UsageEvent, 'clientId' | 'personId'>[],
): Promise<Names> {
  const [clientIds, personIds] = [
    distinct(rows.map(({ clientId }) => clientId)),
    distinct(rows.map(({ personId }) => personId)),
  ];
  const attributes = ['id', 'name'];
  const [clients, people] = await Promise.all([
    clientIds.length === 0 ? [] : Client.findAll({ attributes, where: { id: clientIds } }),
    personIds.length === 0 ? [] : User.findAll({ attributes, where: { id: personIds } }),
  ]);
  return { clients: byId(clients), people: byId(people) };
}

/** Ids of the clients whose name holds the text, whatever its capitals. */
export async function clientsNamed(part: string): Promise<string[]> {
  const rows = await Client.findAll({
    attributes: ['id'],
    where: where(fn('strpos', fn('lower', col('name')), part.toLowerCase()), { [Op.gt]: 0 }),
  });
  return rows.map(({ id }) => id);
}
