import { AllowNull, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { StageKind } from '../../calculator/engine';

export const STAGE_SCHEMA_VERSION = 1;

/** The parts of a stage by its kind, under the names of the calculator. */
export interface StageParameters extends Readonly<Record<string, unknown>> {
  readonly schemaVersion: typeof STAGE_SCHEMA_VERSION;
}

@Table({ tableName: 'stages', timestamps: false })
export class StageRow extends Model {
  @PrimaryKey
  @Column(DataType.UUID)
  declare optionId: string;

  @PrimaryKey
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.INTEGER)
  declare position: number;

  @AllowNull(false)
  @Column(DataType.STRING(20))
  declare kind: StageKind;

  @AllowNull(false)
  @Column(DataType.STRING(120))
  declare name: string;

  @Column(DataType.UUID)
  declare deviceId: string | null;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare parameters: StageParameters;
}
