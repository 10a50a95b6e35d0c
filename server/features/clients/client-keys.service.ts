import { Op, type Sequelize } from 'sequelize';
import { ApiKey } from '../../../db/models';
import { pageOf, readPage } from '../../middleware/page';
import { Problem } from '../../middleware/problem';
import type { Query } from '../../middleware/route';
import { audit, personActor } from '../audit/audit';
import { mintKey } from '../keys/key-format';
import type { Person } from '../people/person';
import type { ProfileService } from '../profiles/profiles.service';
import type { ClientService } from './clients.service';
import { keyFaults, scopesOf, type KeyRequest } from './key-issue';

const selectorPattern = /^[0-9A-Za-z]{12}$/;

/** A key as the API gives it: never more of it than its public part. */
function toKeyBody(row: ApiKey, now = new Date()) {
  const { selector, clientId, kind, label, scopes, origins, profiles, rateLimit } = row;
  const { createdAt, expiresAt, revokedAt, lastUsedOn } = row;
  const expired = expiresAt !== null && expiresAt <= now;
  const state = revokedAt !== null ? 'revoked' : expired ? 'expired' : 'live';
  return {
    selector,
    clientId,
    kind,
    label,
    scopes,
    origins,
    profiles,
    rateLimit,
    createdAt,
    expiresAt,
    revokedAt,
    lastUsedOn,
    state,
  };
}

export type KeyBody = ReturnType<typeof toKeyBody>;

const everything = { profiles: null, defaultProfile: null, pins: {} };

/** The keys of clients, as administrators see them. */
export class ClientKeyService {
  constructor(
    private readonly sequelize: Sequelize,
    private readonly clients: Pick<ClientService, 'row'>,
    private readonly profiles: Pick<ProfileService, 'list'>,
  ) {}

  /** Newest first. */
  async list(
    clientId: string,
    query: Query,
  ): Promise<{ items: KeyBody[]; nextPageToken: string | null }> {
    const client = await this.clients.row(clientId);
    const { size, after } = readPage(query, (mark) => selectorPattern.test(mark));
    const rows = await this.sequelize.query(
      `SELECT * FROM api_keys
        WHERE client_id = $1 AND ($2::text IS NULL OR (created_at, selector) <
          (SELECT created_at, selector FROM api_keys WHERE selector = $2))
        ORDER BY created_at DESC, selector DESC LIMIT $3`,
      { bind: [client.id, after ?? null, size + 1], model: ApiKey, mapToModel: true },
    );
    const { items, nextPageToken } = pageOf(rows, size, ({ selector }) => selector);
    return { items: items.map((row) => toKeyBody(row)), nextPageToken };
  }

  /** @returns the key with its text: the only time it is told. */
  async issue(
    clientId: string,
    request: KeyRequest,
    by: Person,
  ): Promise<{ key: KeyBody; text: string }> {
    const client = await this.clients.row(clientId);
    if (client.disabledAt !== null)
      throw new Problem('client-disabled', 'The client is out of use.');
    const slugs = (await this.profiles.list(everything)).map(({ slug }) => slug);
    const errors = keyFaults(request, slugs, new Date());
    if (errors.length > 0)
      throw new Problem('not-valid', 'Some of the key cannot be as asked.', { errors });
    const { kind, label, origins = [], profiles = null, rateLimit = null } = request;
    const { text, selector, sha256 } = mintKey(kind);
    const scopes = [...scopesOf(request)];
    const expiresAt = typeof request.expiresAt === 'string' ? new Date(request.expiresAt) : null;
    const row = await this.sequelize.transaction(async (transaction) => {
      const made = await ApiKey.create(
        {
          clientId: client.id,
          kind,
          selector,
          secretSha256: sha256,
          label,
          scopes,
          origins: [...origins],
          profiles: profiles && [...profiles],
          rateLimit,
          expiresAt,
        },
        { transaction },
      );
      const detail = { client: client.id, kind, label, scopes, origins, profiles, expiresAt };
      const actor = personActor(by);
      await audit({ actor, action: 'key.issued', subject: selector, detail }, transaction);
      return made;
    });
    await row.reload();
    return { key: toKeyBody(row), text };
  }

  /** Takes a key out of use for good; once more changes nothing. */
  async revoke(selector: string, by: Person): Promise<KeyBody> {
    const row = selectorPattern.test(selector)
      ? await ApiKey.findOne({ where: { selector } })
      : null;
    if (!row) throw new Problem('not-found', 'There is no such key.');
    await this.sequelize.transaction(async (transaction) => {
      const [changed] = await ApiKey.update(
        { revokedAt: new Date() },
        { where: { selector, revokedAt: { [Op.is]: null } }, transaction },
      );
      if (changed === 0) return;
      const detail = { client: row.clientId };
      const actor = personActor(by);
      await audit({ actor, action: 'key.revoked', subject: selector, detail }, transaction);
    });
    await row.reload();
    return toKeyBody(row);
  }
}
