import { ApiProperty, ApiSchema, getSchemaPath } from '@nestjs/swagger';
import { DEVICE_KINDS } from '../../calculator/engine';
import type { DeviceKind, Grade, Lifecycle } from '../../calculator/engine';
import { Choice, QueryFlag } from '../../common/fields/choice';
import { QueryQuantity } from '../../common/fields/quantity';
import { Text } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { GRADES, LIFECYCLES } from './device-fields.dto';
import type { LibraryDeviceDto } from './library-device.dto';

export const DEVICE_SORTS = ['partNumber', 'gbw', 'price', 'updated'] as const;
export type DeviceSort = (typeof DEVICE_SORTS)[number];

export class DeviceQueryDto {
  @Text({ maximum: TEXT_LIMITS.shortText, optional: true, empty: true, description: 'Part number or maker contains' })
  readonly search?: string;

  @Choice(DEVICE_KINDS, { name: 'DeviceKind', optional: true })
  readonly kind?: DeviceKind;

  @Choice(GRADES, { name: 'Grade', optional: true })
  readonly grade?: Grade;

  @Choice(LIFECYCLES, { name: 'Lifecycle', optional: true })
  readonly lifecycle?: Lifecycle;

  @QueryQuantity('gainBandwidthHz', 'Minimum GBW at least; 0.7 × typical where only that is given')
  readonly minimumGbwHz?: number;

  @QueryQuantity('unitPriceMicros', 'Lowest unit price of the quote at most')
  readonly maximumPriceMicros?: number;

  @QueryFlag()
  readonly verified?: boolean;

  @Choice(DEVICE_SORTS, { optional: true })
  readonly sort?: DeviceSort;

  @Choice(['asc', 'desc'], { optional: true })
  readonly order?: 'asc' | 'desc';

  @QueryQuantity('page')
  readonly page?: number;

  @QueryQuantity('pageSize')
  readonly pageSize?: number;
}

@ApiSchema({ name: 'DeviceList' })
export class DeviceListDto {
  @ApiProperty({ type: 'array', items: { $ref: getSchemaPath('LibraryDevice') } })
  readonly items: readonly LibraryDeviceDto[];

  @ApiProperty({ type: 'integer' }) readonly total: number;
}

@ApiSchema({ name: 'DeviceUse' })
export class DeviceUseDto {
  @ApiProperty({ description: 'Code and name' }) readonly project: string;
  @ApiProperty() readonly chain: string;
  @ApiProperty() readonly option: string;
  @ApiProperty({ description: 'Label and name, e.g. "S2 Gain"' }) readonly stage: string;
  @ApiProperty({ format: 'uuid' }) readonly projectId: string;
  @ApiProperty({ format: 'uuid' }) readonly chainId: string;
  @ApiProperty({ format: 'uuid' }) readonly optionId: string;
}

@ApiSchema({ name: 'DeviceUses' })
export class DeviceUsesDto {
  @ApiProperty({ type: () => [DeviceUseDto] }) readonly where: readonly DeviceUseDto[];
  @ApiProperty({ type: 'integer', description: 'Uses in projects that you cannot see' }) readonly hiddenCount: number;
}
