import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { DeviceKind, Grade, Lifecycle } from '../../calculator/engine';

/** Datasheet values lie in `parameters` under the names of the calculator; the rest are columns of their own. */
@Table({ tableName: 'devices' })
export class Device extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.STRING(20))
  declare kind: DeviceKind;

  @AllowNull(false)
  @Column(DataType.STRING(60))
  declare partNumber: string;

  /** Empty where the maker is not given, so that a part number stays unique. */
  @AllowNull(false)
  @Column(DataType.STRING(120))
  declare maker: string;

  @AllowNull(false)
  @Column(DataType.STRING(20))
  declare grade: Grade;

  @Column(DataType.STRING(120))
  declare package: string | null;

  @Column(DataType.STRING(20))
  declare lifecycle: Lifecycle | null;

  @Column(DataType.DATEONLY)
  declare lifecycleDate: string | null;

  @AllowNull(false)
  @Column(DataType.INTEGER)
  declare channels: number;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare parameters: Readonly<Record<string, unknown>>;

  @Column(DataType.STRING(120))
  declare datasheetRevision: string | null;

  @Column(DataType.STRING(120))
  declare datasheetTitle: string | null;

  @Column(DataType.TEXT)
  declare notes: string | null;

  @AllowNull(false)
  @Column(DataType.UUID)
  declare enteredById: string;

  /** Who entered or last changed the electrical values: this person may not verify them. */
  @AllowNull(false)
  @Column(DataType.UUID)
  declare valuesEditedById: string;

  @Column(DataType.UUID)
  declare verifiedById: string | null;

  @Column(DataType.DATE)
  declare verifiedAt: Date | null;

  @AllowNull(false)
  @Default(1)
  @Column(DataType.INTEGER)
  declare version: number;

  declare createdAt: Date;
  declare updatedAt: Date;
}
