import { QueryTypes, UniqueConstraintError, type Sequelize, type Transaction } from 'sequelize';
import { Client } from '../../../db/models';
import type { RefusalItem } from '../../engine/refusal';
import { pageOf, readPage } from '../../middleware/page';
import { Problem } from '../../middleware/problem';
import type { Query } from '../../middleware/route';
import { audit, personActor } from '../audit/audit';
import type { Person } from '../people/person';
import type { ProfileService } from '../profiles/profiles.service';
import { toClient, uuid, type ClientBody } from './client';

/** What an administrator says of a client. */
export interface ClientChange {
  readonly name?: string;
  readonly defaultProfile?: string | null;
  /** `uk-na@1` */
  readonly pins?: readonly string[];
  readonly disabled?: boolean;
}

const everything = { profiles: null, defaultProfile: null, pins: {} };

/** The tools that call the service. */
export class ClientService {
  constructor(
    private readonly sequelize: Sequelize,
    private readonly profiles: Pick<ProfileService, 'list'>,
  ) {}

  /** By name; a page is told by the last client of the one before. */
  async list(query: Query): Promise<{ items: ClientBody[]; nextPageToken: string | null }> {
    const { size, after } = readPage(query, (mark) => uuid.test(mark));
    const rows = await this.sequelize.query(
      `SELECT * FROM clients
        WHERE $1::uuid IS NULL OR (lower(name), id) > (SELECT lower(name), id FROM clients WHERE id = $1)
        ORDER BY lower(name), id LIMIT $2`,
      { bind: [after ?? null, size + 1], model: Client, mapToModel: true },
    );
    const { items, nextPageToken } = pageOf(rows, size, ({ id }) => id);
    const live = await this.liveKeys(items.map(({ id }) => id));
    return { items: items.map((row) => toClient(row, live.get(row.id) ?? 0)), nextPageToken };
  }

  async read(id: string): Promise<ClientBody> {
    return this.body(await this.row(id));
  }

  async make(change: ClientChange & { readonly name: string }, by: Person): Promise<ClientBody> {
    await this.assertProfiles(change);
    const row = await this.named(change.name, (transaction) =>
      this.insert(change, by, transaction),
    );
    return toClient(row, 0);
  }

  async change(id: string, change: ClientChange, by: Person): Promise<ClientBody> {
    await this.assertProfiles(change);
    const row = await this.row(id);
    await this.named(change.name, async (transaction) => {
      const { disabled, pins, ...said } = change;
      const disabledAt = disabled ? (row.disabledAt ?? new Date()) : null;
      await row.update(
        {
          ...said,
          ...(pins && { pins: pinsOf(pins) }),
          ...(disabled !== undefined && { disabledAt }),
        },
        { transaction },
      );
      const subject = `client:${row.id}`;
      const entry = { actor: personActor(by), action: 'client.changed', subject } as const;
      await audit({ ...entry, detail: { ...change } }, transaction);
    });
    return this.body(row);
  }

  /** @throws {Problem} `not-found`. */
  async row(id: string): Promise<Client> {
    const row = uuid.test(id) ? await Client.findByPk(id) : null;
    if (!row) throw new Problem('not-found', 'There is no such client.');
    return row;
  }

  private async insert(
    { name, defaultProfile = null, pins = [] }: ClientChange & { readonly name: string },
    by: Person,
    transaction: Transaction,
  ): Promise<Client> {
    const said = { name, defaultProfile, pins: pinsOf(pins) };
    const row = await Client.create(said, { transaction });
    const subject = `client:${row.id}`;
    const detail = { name, defaultProfile, pins };
    await audit({ actor: personActor(by), action: 'client.made', subject, detail }, transaction);
    return row;
  }

  private async body(row: Client): Promise<ClientBody> {
    return toClient(row, (await this.liveKeys([row.id])).get(row.id) ?? 0);
  }

  private async named<T>(
    name: string | undefined,
    work: (transaction: Transaction) => Promise<T>,
  ): Promise<T> {
    try {
      return await this.sequelize.transaction(work);
    } catch (error) {
      if (!(error instanceof UniqueConstraintError)) throw error;
      const message = `There is a client "${name ?? ''}" already.`;
      throw new Problem('name-taken', message, {
        errors: [{ pointer: '/name', code: 'taken', message }],
      });
    }
  }

  private async liveKeys(ids: readonly string[]): Promise<ReadonlyMap<string, number>> {
    if (ids.length === 0) return new Map();
    const rows = await this.sequelize.query<{ id: string; live: number }>(
      `SELECT client_id AS id, count(*)::int AS live FROM api_keys
        WHERE client_id = ANY($1::uuid[]) AND revoked_at IS NULL
          AND (expires_at IS NULL OR expires_at > now())
        GROUP BY client_id`,
      { bind: [ids], type: QueryTypes.SELECT },
    );
    return new Map(rows.map(({ id, live }) => [id, live]));
  }

  /** A client is held only to profiles, and to approved revisions, that there are. */
  private async assertProfiles({ defaultProfile, pins = [] }: ClientChange): Promise<void> {
    const known = await this.profiles.list(everything);
    const errors: RefusalItem[] = [];
    const fix = `There are: ${known.map(({ slug }) => slug).join(', ')}.`;
    if (typeof defaultProfile === 'string' && !known.some(({ slug }) => slug === defaultProfile)) {
      const message = 'There is no such factor profile.';
      errors.push({ pointer: '/defaultProfile', code: 'unknown', message, fix });
    }
    for (const [index, pin] of pins.entries()) {
      const [slug = '', revision] = pin.split('@');
      const pointer = `/pins/${index}`;
      const held = known.find((each) => each.slug === slug)?.revisions ?? [];
      if (pins.findIndex((each) => each.startsWith(`${slug}@`)) < index) {
        const message = `${slug} is held at another revision already.`;
        errors.push({ pointer, code: 'repeated', message });
      } else if (!held.some((each) => each.revision === Number(revision) && isApproved(each))) {
        errors.push({ pointer, code: 'unknown', message: `${pin} is no approved revision.`, fix });
      }
    }
    if (errors.length > 0)
      throw new Problem('not-valid', 'Some of the factor profiles are not there.', { errors });
  }
}

const isApproved = ({ status }: { readonly status: string }): boolean => status === 'approved';

const pinsOf = (pins: readonly string[]): Record<string, number> =>
  Object.fromEntries(
    pins.map((pin): [string, number] => {
      const [slug = '', revision] = pin.split('@');
      return [slug, Number(revision)];
    }),
  );
