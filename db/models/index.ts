import type { Sequelize } from 'sequelize';
import { ApiKey, initApiKey } from './api-key';
import { AuditEvent, initAuditEvent } from './audit-event';
import { Client, initClient } from './client';
import { FactorProfile, initFactorProfile } from './factor-profile';
import { initProfileRevision, ProfileRevisionRow } from './profile-revision';
import { initRateCount, RateCount } from './rate-count';
import { initUsageEvent, UsageEvent } from './usage-event';
import { initUsageHour, UsageHour } from './usage-hour';
import { initUser, User } from './user';

export {
  ApiKey,
  AuditEvent,
  Client,
  FactorProfile,
  ProfileRevisionRow,
  RateCount,
  UsageEvent,
  UsageHour,
  User,
};
export type { KeyKind } from './api-key';
export type { UsagePhase } from './usage-event';

/** Binds every model to a connection. */
export function initModels(sequelize: Sequelize): void {
  initClient(sequelize);
  initApiKey(sequelize);
  initFactorProfile(sequelize);
  initProfileRevision(sequelize);
  initUsageEvent(sequelize);
  initUsageHour(sequelize);
  initRateCount(sequelize);
  initAuditEvent(sequelize);
  initUser(sequelize);
}
