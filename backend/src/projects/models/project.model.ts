import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { Policy } from '../../calculator/engine';

@Table({ tableName: 'projects' })
export class Project extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.STRING(24))
  declare code: string;

  @AllowNull(false)
  @Column(DataType.STRING(120))
  declare name: string;

  @AllowNull(false)
  @Column(DataType.TEXT)
  declare description: string;

  @AllowNull(false)
  @Column(DataType.BOOLEAN)
  declare open: boolean;

  @AllowNull(false)
  @Column(DataType.STRING(3))
  declare currency: string;

  @AllowNull(false)
  @Column(DataType.INTEGER)
  declare buildQuantity: number;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare policy: Policy;

  @AllowNull(false)
  @Default(1)
  @Column(DataType.INTEGER)
  declare version: number;

  declare createdAt: Date;
  declare updatedAt: Date;
}
