import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

export type KeyKind = 'secret' | 'page' | 'cell';

/** A key of a client. Its secret is never stored: the selector finds it, the hash proves it. */
export class ApiKey extends Model<InferAttributes<ApiKey>, InferCreationAttributes<ApiKey>> {
  declare id: CreationOptional<string>;
  declare clientId: string;
  declare kind: KeyKind;
  declare selector: string;
  declare secretSha256: Buffer;
  declare label: string;
  declare scopes: string[];
  /** Exact origins of a page key; none means no browser. */
  declare origins: CreationOptional<string[]>;
  /** Slugs the key may use; null means all. */
  declare profiles: CreationOptional<string[] | null>;
  /** Calls a minute; null means the service's own limit. */
  declare rateLimit: CreationOptional<number | null>;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: CreationOptional<Date | null>;
  declare revokedAt: CreationOptional<Date | null>;
  /** A day, `2026-01-31`: finer would cost a write per call. */
  declare lastUsedOn: CreationOptional<string | null>;
}

export function initApiKey(sequelize: Sequelize): void {
  ApiKey.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      clientId: { type: DataTypes.UUID, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      selector: { type: DataTypes.TEXT, allowNull: false, unique: true },
      secretSha256: { type: DataTypes.BLOB, allowNull: false, field: 'secret_sha256' },
      label: { type: DataTypes.TEXT, allowNull: false },
      scopes: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false },
      origins: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
      profiles: { type: DataTypes.ARRAY(DataTypes.TEXT) },
      rateLimit: { type: DataTypes.INTEGER },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      expiresAt: { type: DataTypes.DATE },
      revokedAt: { type: DataTypes.DATE },
      lastUsedOn: { type: DataTypes.DATEONLY },
    },
    { sequelize, tableName: 'api_keys' },
  );
}
