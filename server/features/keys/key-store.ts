import type { Sequelize } from 'sequelize';
import { ApiKey, Client } from '../../../db/models';
import type { Key } from './key';

/** Where keys are kept. */
export interface KeyStore {
  all(): Promise<Key[]>;
  find(selector: string): Promise<Key | undefined>;
  /** Notes the day a key was last used; a day that is noted already writes nothing. */
  noteUse(ids: readonly string[]): Promise<void>;
}

function toKey(row: ApiKey, client: Client | undefined): Key {
  return {
    id: row.id,
    clientId: row.clientId,
    kind: row.kind,
    selector: row.selector,
    sha256: row.secretSha256,
    scopes: row.scopes,
    origins: row.origins,
    profiles: row.profiles,
    rateLimit: row.rateLimit,
    expiresAt: row.expiresAt,
    revokedAt: row.revokedAt ?? client?.disabledAt ?? null,
    defaultProfile: client?.defaultProfile ?? null,
    pins: client?.pins ?? {},
  };
}

export class DatabaseKeyStore implements KeyStore {
  constructor(private readonly sequelize: Sequelize) {}

  async all(): Promise<Key[]> {
    const [rows, clients] = await Promise.all([ApiKey.findAll(), Client.findAll()]);
    const byId = new Map(clients.map((client) => [client.id, client]));
    return rows.map((row) => toKey(row, byId.get(row.clientId)));
  }

  async find(selector: string): Promise<Key | undefined> {
    const row = await ApiKey.findOne({ where: { selector } });
    if (!row) return undefined;
    return toKey(row, (await Client.findByPk(row.clientId)) ?? undefined);
  }

  async noteUse(ids: readonly string[]): Promise<void> {
    await this.sequelize.query(
      `UPDATE api_keys SET last_used_on = current_date
        WHERE id = ANY($1::uuid[]) AND last_used_on IS DISTINCT FROM current_date`,
      { bind: [ids] },
    );
  }
}
