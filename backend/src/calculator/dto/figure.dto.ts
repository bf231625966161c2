import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { membersOf } from '../../common/fields/choice';
import type { Figure, Money, Unit, Verdict } from '../engine';

export const VERDICTS = membersOf<Verdict>({ clear: true, tight: true, over: true, unknown: true });

export const UNITS = membersOf<Unit>({
  Hz: true,
  V: true,
  A: true,
  W: true,
  Ω: true,
  F: true,
  s: true,
  dB: true,
  dBΩ: true,
  ratio: true,
  gain: true,
  number: true,
  deg: true,
  'V/s': true,
  'V/√Hz': true,
  'A/√Hz': true,
  fraction: true,
});

/** A number that is ready to print; never NaN or infinite. */
@ApiSchema({ name: 'Figure' })
export class FigureDto implements Figure {
  @ApiProperty({ type: 'number', nullable: true }) readonly value: number | null;
  @ApiProperty({ enum: UNITS, enumName: 'Unit' }) readonly unit: Unit;
  @ApiProperty({ type: 'integer', description: 'Significant digits to print' }) readonly digits: number;
  @ApiProperty({ required: false, description: 'Why there is no value; always there when value is null' })
  readonly reason?: string;
  @ApiProperty({ required: false, description: 'A value that the datasheet does not give went into it' })
  readonly assumed?: boolean;
}

@ApiSchema({ name: 'Money' })
export class MoneyDto implements Money {
  @ApiProperty({ type: 'integer', nullable: true, description: 'Millionths of the currency unit' })
  readonly amountMicros: number | null;
  @ApiProperty({ description: 'ISO 4217' }) readonly currency: string;
  @ApiProperty({ required: false, description: 'Why there is no amount' }) readonly reason?: string;
}
