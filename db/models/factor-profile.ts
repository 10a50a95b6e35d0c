import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A named set of factors; what it says stands in its revisions. */
export class FactorProfile extends Model<
  InferAttributes<FactorProfile>,
  InferCreationAttributes<FactorProfile>
> {
  declare slug: string;
  declare title: string;
  declare owner: string;
  declare createdAt: CreationOptional<Date>;
}

export function initFactorProfile(sequelize: Sequelize): void {
  FactorProfile.init(
    {
      slug: { type: DataTypes.TEXT, primaryKey: true },
      title: { type: DataTypes.TEXT, allowNull: false },
      owner: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'factor_profiles' },
  );
}
