import { Transform } from 'class-transformer';
import { Quantity, numberOf } from './quantity';

/** `?version=`: the version that was read of the row to be removed. */
export class VersionQueryDto {
  @Quantity('version', { description: 'The version that was read' })
  @Transform(({ value }) => numberOf(value))
  readonly version: number;
}
