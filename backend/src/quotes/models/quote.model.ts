import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'quotes' })
export class Quote extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.UUID)
  declare deviceId: string;

  @AllowNull(false)
  @Column(DataType.STRING(3))
  declare currency: string;

  @Column(DataType.STRING(120))
  declare reference: string | null;

  @Column(DataType.DATEONLY)
  declare validUntil: string | null;

  @Column(DataType.STRING(120))
  declare supplier: string | null;

  @AllowNull(false)
  @Column(DataType.UUID)
  declare enteredById: string;

  @AllowNull(false)
  @Default(1)
  @Column(DataType.INTEGER)
  declare version: number;
}
