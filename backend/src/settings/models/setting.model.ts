import { AllowNull, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'settings' })
export class Setting extends Model {
  @PrimaryKey
  @Column(DataType.STRING(100))
  declare key: string;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare value: unknown;
}
