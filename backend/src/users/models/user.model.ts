import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';
import type { Role } from '../../common/role';

@Table({ tableName: 'users' })
export class User extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.STRING(200))
  declare name: string;

  @AllowNull(false)
  @Column(DataType.STRING(254))
  declare email: string;

  /** What this person does in the invented team; demo accounts only. */
  @Column(DataType.STRING(200))
  declare title: string | null;

  @AllowNull(false)
  @Column(DataType.JSON)
  declare roles: Role[];

  @AllowNull(false)
  @Default(true)
  @Column(DataType.BOOLEAN)
  declare active: boolean;

  @AllowNull(false)
  @Default(false)
  @Column(DataType.BOOLEAN)
  declare isDemo: boolean;

  /** Null until the person has chosen a password. */
  @Column(DataType.TEXT)
  declare passwordHash: string | null;

  /** Sessions begun in an earlier epoch are void. */
  @AllowNull(false)
  @Default(0)
  @Column(DataType.INTEGER)
  declare sessionEpoch: number;

  @AllowNull(false)
  @Default(1)
  @Column(DataType.INTEGER)
  declare version: number;

  declare createdAt: Date;
  declare updatedAt: Date;
}
