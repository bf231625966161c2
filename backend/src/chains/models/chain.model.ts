import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { Specification } from '../../calculator/engine';

@Table({ tableName: 'chains' })
export class Chain extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.UUID)
  declare projectId: string;

  @AllowNull(false)
  @Column(DataType.STRING(120))
  declare name: string;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare specification: Specification;

  @AllowNull(false)
  @Default(1)
  @Column(DataType.INTEGER)
  declare version: number;

  declare createdAt: Date;
  declare updatedAt: Date;
}
