import type { Transaction } from 'sequelize';
import { AuditEvent } from '../../../db/models';

/** What is written down for good, whoever did it. */
export type AuditAction =
  | 'session.opened'
  | 'session.refused'
  | 'session.closed'
  | 'client.made'
  | 'client.changed'
  | 'key.issued'
  | 'key.revoked';

export interface AuditEntry {
  /** `person:<id>`, or `nobody`. */
  readonly actor: string;
  readonly action: AuditAction;
  /** What it was done to: `person:<id>`, `client:<id>`, a key's selector. */
  readonly subject: string;
  readonly detail?: Record<string, unknown>;
}

export const personActor = ({ id }: { readonly id: string }): string => `person:${id}`;

/** In the transaction of the deed: neither is ever there without the other. */
export async function audit(entry: AuditEntry, transaction?: Transaction): Promise<void> {
  await AuditEvent.create(
    { ...entry, detail: entry.detail ?? {} },
    transaction ? { transaction } : {},
  );
}
