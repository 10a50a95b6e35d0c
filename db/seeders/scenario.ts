import { timingSafeEqual } from 'node:crypto';
import type { Sequelize } from 'sequelize';
import { mintKey, parseKey } from '../../server/features/keys/key-format';
import { ApiKey, AuditEvent, Client, ProfileRevisionRow } from '../models';
import { addApprovedRevision } from '../revise';
import { COPPER_LANE_HOUSE, copperLaneHouse } from './copper-lane-house';

/**
 * The invented scenario: Saltmarsh Temporary Works designs the props and walers of the Copper Lane
 * basement. No firm, job or person of that name is meant. For a demonstration, never for a firm's
 * own database.
 */
const LEAD_ENGINEER = 'Lead engineer, Saltmarsh Temporary Works';
const ADMIN = 'Admin, Saltmarsh Temporary Works';
const DEMO_LABEL = 'Demo key of this machine';

const clients = {
  scripts: { id: '5a17c0de-0001-4000-8000-000000000001', name: 'Falsework scripts' },
  intranet: {
    id: '5a17c0de-0001-4000-8000-000000000002',
    name: 'Copper Lane intranet',
    defaultProfile: COPPER_LANE_HOUSE,
  },
  workbook: { id: '5a17c0de-0001-4000-8000-000000000003', name: 'Waler schedule workbook' },
};

/**
 * Adds what is missing of the scenario, as the owner.
 *
 * @param knownKey the demo key an earlier start made; it is kept while it still opens.
 * @returns the demo key, new when the known one does not open.
 */
export async function seedScenario(
  owner: Sequelize,
  knownKey: string | undefined,
): Promise<string> {
  // Those already there stay as they are, whatever became of the set they started from.
  const there = await ProfileRevisionRow.count({ where: { slug: COPPER_LANE_HOUSE } });
  for (const revision of copperLaneHouse().slice(there)) {
    await addApprovedRevision(owner, revision, LEAD_ENGINEER);
  }
  for (const client of Object.values(clients)) {
    await Client.findOrCreate({ where: { id: client.id }, defaults: client });
  }
  return (await stillOpens(knownKey)) ?? (await mintDemoKey());
}

async function stillOpens(known: string | undefined): Promise<string | undefined> {
  const parsed = known === undefined ? undefined : parseKey(known);
  if (!parsed) return undefined;
  const row = await ApiKey.findOne({ where: { selector: parsed.selector, revokedAt: null } });
  return row && timingSafeEqual(row.secretSha256, parsed.sha256) ? known : undefined;
}

async function mintDemoKey(): Promise<string> {
  const clientId = clients.scripts.id;
  await ApiKey.update(
    { revokedAt: new Date() },
    { where: { clientId, label: DEMO_LABEL, revokedAt: null } },
  );
  const { text, selector, sha256, kind } = mintKey('secret');
  await ApiKey.create({
    clientId,
    kind,
    selector,
    secretSha256: sha256,
    label: DEMO_LABEL,
    scopes: ['checks', 'catalogue', 'admin'],
  });
  await AuditEvent.create({ actor: ADMIN, action: 'key.issued', subject: selector });
  return text;
}
