import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Hits of a subject in one window of a policy; unlogged, so a crash of the database forgets them. */
export class RateCount extends Model<
  InferAttributes<RateCount>,
  InferCreationAttributes<RateCount>
> {
  declare policy: string;
  declare subject: string;
  declare windowStart: Date;
  declare hits: number;
}

export function initRateCount(sequelize: Sequelize): void {
  RateCount.init(
    {
      policy: { type: DataTypes.TEXT, primaryKey: true },
      subject: { type: DataTypes.TEXT, primaryKey: true },
      windowStart: { type: DataTypes.DATE, primaryKey: true },
      hits: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'rate_counts' },
  );
}
