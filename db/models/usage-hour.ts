import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** The calls of one hour that agree in client, route, status and answer; made by the worker. */
export class UsageHour extends Model<
  InferAttributes<UsageHour>,
  InferCreationAttributes<UsageHour>
> {
  declare hour: Date;
  declare clientId: string | null;
  declare route: string;
  declare httpStatus: number | null;
  declare answer: string | null;
  declare calls: number;
  /** A bigint, so text here: its sum may pass what a number holds exactly. */
  declare durationUsSum: string;
}

export function initUsageHour(sequelize: Sequelize): void {
  UsageHour.init(
    {
      hour: { type: DataTypes.DATE, allowNull: false },
      clientId: { type: DataTypes.UUID },
      route: { type: DataTypes.TEXT, allowNull: false },
      httpStatus: { type: DataTypes.SMALLINT },
      answer: { type: DataTypes.TEXT },
      calls: { type: DataTypes.INTEGER, allowNull: false },
      durationUsSum: { type: DataTypes.BIGINT, allowNull: false },
    },
    { sequelize, tableName: 'usage_hourly' },
  );
  UsageHour.removeAttribute('id');
}
