import { AllowNull, AutoIncrement, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'audit_events', timestamps: false })
export class AuditEvent extends Model {
  @PrimaryKey
  @AutoIncrement
  @Column(DataType.INTEGER)
  declare id: number;

  @AllowNull(false)
  @Column(DataType.DATE)
  declare at: Date;

  @Column(DataType.UUID)
  declare actorId: string | null;

  @AllowNull(false)
  @Column(DataType.STRING(100))
  declare action: string;

  @AllowNull(false)
  @Column(DataType.STRING(50))
  declare entity: string;

  @AllowNull(false)
  @Column(DataType.STRING(100))
  declare entityId: string;

  @Column(DataType.JSON)
  declare before: unknown;

  @Column(DataType.JSON)
  declare after: unknown;

  @Column(DataType.UUID)
  declare requestId: string | null;
}
