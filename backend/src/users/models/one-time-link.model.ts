import { AllowNull, Column, DataType, Default, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'one_time_links' })
export class OneTimeLink extends Model {
  @PrimaryKey
  @Default(DataType.UUIDV4)
  @Column(DataType.UUID)
  declare id: string;

  @AllowNull(false)
  @Column(DataType.UUID)
  declare userId: string;

  /** SHA-256 of the token, in hexadecimal: the database alone opens no account. */
  @AllowNull(false)
  @Column(DataType.CHAR(64))
  declare tokenHash: string;

  @AllowNull(false)
  @Column(DataType.DATE)
  declare expiresAt: Date;

  @Column(DataType.UUID)
  declare createdById: string | null;
}
