import { clientsAndKeys } from './001-clients-and-keys';
import { profiles } from './002-profiles';
import { usage } from './003-usage';
import { ratesAndAudit } from './004-rates-and-audit';
import { people } from './005-people';
import type { Migration } from './migration';

/** Every migration, oldest first. A list, not a folder scan: the bundle has no folder. */
export const migrations: readonly Migration[] = [
  clientsAndKeys,
  profiles,
  usage,
  ratesAndAudit,
  people,
];
