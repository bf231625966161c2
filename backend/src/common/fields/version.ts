import { Transform } from 'class-transformer';
import { Quantity } from './quantity';

/** `?version=`: the version that was read of the row to be removed. */
export class VersionQueryDto {
  @Quantity('version', { description: 'The version that was read' })
  @Transform(({ value }) => (typeof value === 'string' && value.trim() !== '' ? Number(value) : value))
  readonly version: number;
}
