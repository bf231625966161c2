import { AllowNull, Column, DataType, Model, PrimaryKey, Table } from 'sequelize-typescript';

@Table({ tableName: 'quote_breaks', timestamps: false })
export class QuoteBreak extends Model {
  @PrimaryKey
  @Column(DataType.UUID)
  declare quoteId: string;

  @PrimaryKey
  @Column(DataType.INTEGER)
  declare quantity: number;

  /** Millionths of the currency unit, an integer. */
  @AllowNull(false)
  @Column(DataType.BIGINT)
  declare unitPriceMicros: number;
}
