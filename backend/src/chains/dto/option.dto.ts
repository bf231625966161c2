import { ApiProperty, ApiSchema, getSchemaPath } from '@nestjs/swagger';
import { STAGE } from '../../calculator/dto/stage.dto';
import type { StageDto } from '../../calculator/dto/stage.dto';
import type { Stage } from '../../calculator/engine';
import { NestedUnionList } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { Text, Uuid } from '../../common/fields/text';
import { LIST_LIMITS, TEXT_LIMITS } from '../../common/limits';
import type { LibraryDeviceDto } from '../../devices/dto/library-device.dto';

@ApiSchema({ name: 'CreateOption' })
export class CreateOptionDto {
  @Text({ maximum: TEXT_LIMITS.name })
  readonly name: string;

  @Uuid({ optional: true, description: 'Take the stages of this option of the same chain' })
  readonly fromOptionId?: string;
}

@ApiSchema({ name: 'SaveOption' })
export class SaveOptionDto {
  @Quantity('version', { description: 'The version that was read' })
  readonly version: number;

  @Text({ maximum: TEXT_LIMITS.name })
  readonly name: string;

  @NestedUnionList(STAGE, {
    maximum: LIST_LIMITS.stages,
    tooManyCode: 'too_many_stages',
    description: 'In signal order',
  })
  readonly stages: readonly StageDto[];
}

@ApiSchema({ name: 'OptionRights' })
export class OptionRightsDto {
  @ApiProperty() readonly edit: boolean;
  @ApiProperty({ description: 'False for the last option of a chain' }) readonly delete: boolean;
}

@ApiSchema({ name: 'Option' })
export class OptionDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty({ format: 'uuid' }) readonly chainId: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ type: 'integer' }) readonly position: number;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: 'array', items: { $ref: getSchemaPath('Stage') } }) readonly stages: readonly Stage[];
  @ApiProperty({
    type: 'array',
    items: { $ref: getSchemaPath('LibraryDevice') },
    description: 'The devices that the stages name',
  })
  readonly devices: readonly LibraryDeviceDto[];
  @ApiProperty({ type: () => OptionRightsDto }) readonly can: OptionRightsDto;
}
