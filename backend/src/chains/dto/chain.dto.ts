import { ApiProperty, ApiSchema, PartialType } from '@nestjs/swagger';
import { SpecificationDto } from '../../calculator/dto/specification.dto';
import type { Policy, Specification } from '../../calculator/engine';
import { Nested } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { Text } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { PolicyDto } from '../../projects/dto/policy.dto';
import { OptionSummaryDto } from './summary.dto';

@ApiSchema({ name: 'CreateChain' })
export class CreateChainDto {
  @Text({ maximum: TEXT_LIMITS.name })
  readonly name: string;

  @Nested(() => SpecificationDto)
  readonly specification: SpecificationDto;
}

@ApiSchema({ name: 'UpdateChain' })
export class UpdateChainDto extends PartialType(CreateChainDto, { skipNullProperties: false }) {
  @Quantity('version', { description: 'The version that was read' })
  readonly version: number;
}

@ApiSchema({ name: 'EditRight' })
export class EditRightDto {
  @ApiProperty() readonly edit: boolean;
}

@ApiSchema({ name: 'ChainOption' })
export class ChainOptionDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ type: 'integer' }) readonly position: number;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => OptionSummaryDto }) readonly summary: OptionSummaryDto;
}

@ApiSchema({ name: 'Chain' })
export class ChainDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty({ format: 'uuid' }) readonly projectId: string;
  @ApiProperty() readonly projectCode: string;
  @ApiProperty() readonly projectName: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty({ type: () => SpecificationDto }) readonly specification: Specification;
  @ApiProperty({ type: () => PolicyDto }) readonly policy: Policy;
  @ApiProperty({ description: 'ISO 4217' }) readonly currency: string;
  @ApiProperty({ type: 'integer' }) readonly buildQuantity: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => [ChainOptionDto] }) readonly options: readonly ChainOptionDto[];
  @ApiProperty({ type: () => EditRightDto }) readonly can: EditRightDto;
}

@ApiSchema({ name: 'ChainListOption' })
export class ChainListOptionDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ type: () => OptionSummaryDto }) readonly summary: OptionSummaryDto;
}

@ApiSchema({ name: 'ChainListItem' })
export class ChainListItemDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => OptionSummaryDto, description: 'Of the first option' })
  readonly summary: OptionSummaryDto;
  @ApiProperty({ type: () => [ChainListOptionDto] }) readonly options: readonly ChainListOptionDto[];
  @ApiProperty({ description: 'The specification in one line' }) readonly specificationText: string;
  @ApiProperty({ type: () => EditRightDto }) readonly can: EditRightDto;
}
