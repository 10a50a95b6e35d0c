import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A tool that calls the service and owns keys. */
export class Client extends Model<InferAttributes<Client>, InferCreationAttributes<Client>> {
  declare id: CreationOptional<string>;
  declare name: string;
  /** Slug used when a request names no profile. */
  declare defaultProfile: CreationOptional<string | null>;
  /** Slug to the revision this client is held at. */
  declare pins: CreationOptional<Record<string, number>>;
  declare createdAt: CreationOptional<Date>;
  declare disabledAt: CreationOptional<Date | null>;
}

export function initClient(sequelize: Sequelize): void {
  Client.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      name: { type: DataTypes.TEXT, allowNull: false },
      defaultProfile: { type: DataTypes.TEXT },
      pins: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      disabledAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'clients' },
  );
}
