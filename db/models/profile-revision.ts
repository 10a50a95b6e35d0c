import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Departure, RevisionStatus } from '../../server/engine/profiles/profile';
import type { ProfileTree } from '../../server/engine/profiles/tree';

/**
 * One revision of a factor profile. Once approved its content can never change: a trigger
 * refuses it to everyone, and the application role may update the status columns only.
 */
export class ProfileRevisionRow extends Model<
  InferAttributes<ProfileRevisionRow>,
  InferCreationAttributes<ProfileRevisionRow>
> {
  declare slug: string;
  declare revision: number;
  declare status: RevisionStatus;
  declare tree: ProfileTree;
  declare departures: Departure[];
  /** Over the canonical JSON of tree and departures, in hex. */
  declare sha256: string;
  declare effectiveFrom: CreationOptional<Date>;
  declare expiresAt: CreationOptional<Date | null>;
  declare approvedAt: CreationOptional<Date | null>;
  declare approvedBy: CreationOptional<string | null>;
  declare withdrawnAt: CreationOptional<Date | null>;
  declare withdrawnBy: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
}

export function initProfileRevision(sequelize: Sequelize): void {
  ProfileRevisionRow.init(
    {
      slug: { type: DataTypes.TEXT, primaryKey: true },
      revision: { type: DataTypes.INTEGER, primaryKey: true },
      status: { type: DataTypes.TEXT, allowNull: false },
      tree: { type: DataTypes.JSONB, allowNull: false },
      departures: { type: DataTypes.JSONB, allowNull: false },
      sha256: { type: DataTypes.TEXT, allowNull: false },
      effectiveFrom: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      expiresAt: { type: DataTypes.DATE },
      approvedAt: { type: DataTypes.DATE },
      approvedBy: { type: DataTypes.TEXT },
      withdrawnAt: { type: DataTypes.DATE },
      withdrawnBy: { type: DataTypes.TEXT },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'profile_revisions' },
  );
}
