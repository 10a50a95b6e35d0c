import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** `whole` for a plain answer; a streamed one commits `start` before its first byte, then `end`. */
export type UsagePhase = 'whole' | 'start' | 'end';

/** One call, as logged against the key that made it. Rows are inserted in bulk, beside the model. */
export class UsageEvent extends Model<
  InferAttributes<UsageEvent>,
  InferCreationAttributes<UsageEvent>
> {
  /** A ULID: it carries the time, so that a look-up by id knows its partition. */
  declare id: string;
  declare at: Date;
  declare phase: CreationOptional<UsagePhase>;
  declare clientId: CreationOptional<string | null>;
  declare keyId: CreationOptional<string | null>;
  declare keySelector: CreationOptional<string | null>;
  /** Who was signed in; null for a call with a key. */
  declare personId: CreationOptional<string | null>;
  declare method: string;
  declare route: string;
  declare checkId: CreationOptional<string | null>;
  declare profile: CreationOptional<string | null>;
  declare profileRevision: CreationOptional<number | null>;
  declare httpStatus: CreationOptional<number | null>;
  /** Code of the problem answered, if one was. */
  declare code: CreationOptional<string | null>;
  declare answer: CreationOptional<string | null>;
  declare utilisation: CreationOptional<number | null>;
  declare governing: CreationOptional<string | null>;
  declare items: CreationOptional<number | null>;
  declare durationUs: CreationOptional<number | null>;
  declare address: CreationOptional<string | null>;
  declare origin: CreationOptional<string | null>;
  declare callerRequestId: CreationOptional<string | null>;
  /** How many like calls the row stands for; more than 1 only in a flood of refusals. */
  declare repeats: CreationOptional<number>;
}

export function initUsageEvent(sequelize: Sequelize): void {
  UsageEvent.init(
    {
      id: { type: DataTypes.CHAR(26), primaryKey: true },
      at: { type: DataTypes.DATE, primaryKey: true },
      phase: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'whole' },
      clientId: { type: DataTypes.UUID },
      keyId: { type: DataTypes.UUID },
      keySelector: { type: DataTypes.TEXT },
      personId: { type: DataTypes.UUID },
      method: { type: DataTypes.TEXT, allowNull: false },
      route: { type: DataTypes.TEXT, allowNull: false },
      checkId: { type: DataTypes.TEXT },
      profile: { type: DataTypes.TEXT },
      profileRevision: { type: DataTypes.INTEGER },
      httpStatus: { type: DataTypes.SMALLINT },
      code: { type: DataTypes.TEXT },
      answer: { type: DataTypes.TEXT },
      utilisation: { type: DataTypes.DOUBLE },
      governing: { type: DataTypes.TEXT },
      items: { type: DataTypes.INTEGER },
      durationUs: { type: DataTypes.INTEGER },
      address: { type: DataTypes.INET },
      origin: { type: DataTypes.TEXT },
      callerRequestId: { type: DataTypes.TEXT },
      repeats: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: 'usage_events' },
  );
}
