import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Choice } from '../../common/fields/choice';
import { IdList, Nested, NestedUnionList } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { Currency, Text, Uuid } from '../../common/fields/text';
import { LIST_LIMITS, TEXT_LIMITS } from '../../common/limits';
import { DEVICE } from '../../devices/dto/device-input.dto';
import type { DeviceInputDto } from '../../devices/dto/device-input.dto';
import { PolicyChangeDto } from '../../projects/dto/policy.dto';
import type { CurveRequest, GbwCase, WorkingRequest } from '../engine';
import { ChainReportDto } from './chain-report.dto';
import { CurvesDto } from './curves.dto';
import { SpecificationDto } from './specification.dto';
import { STAGE } from './stage.dto';
import type { StageDto } from './stage.dto';
import { WorkingDto } from './working.dto';

@ApiSchema({ name: 'CurveRequest' })
export class CurveRequestDto implements CurveRequest {
  @Quantity('frequencyHz') readonly fromHz: number;
  @Quantity('frequencyHz') readonly toHz: number;
  @Quantity('curvePoints') readonly points: number;
}

@ApiSchema({ name: 'WorkingRequest' })
export class WorkingRequestDto implements WorkingRequest {
  @Uuid({ nullable: true, description: 'Null: a figure of the chain' })
  readonly stageId: string | null;

  @Text({ maximum: TEXT_LIMITS.shortText, description: "A key of the figures, or 'unitCost' / 'cost'" })
  readonly figure: string;

  @Choice(['typical', 'minimum', 'minimumHot'], { name: 'GbwCase' })
  readonly gbwCase: GbwCase;
}

@ApiSchema({ name: 'CalculationInclude' })
export class CalculationIncludeDto {
  @Nested(() => CurveRequestDto, { optional: true })
  readonly curves?: CurveRequestDto;

  @Nested(() => WorkingRequestDto, { optional: true })
  readonly working?: WorkingRequestDto;
}

/** A whole chain: nothing is stored and nothing but devices is looked up. */
export class ChainInputDto {
  @Nested(() => SpecificationDto)
  readonly specification: SpecificationDto;

  @Nested(() => PolicyChangeDto, { optional: true, description: 'Margins that are absent have their defaults' })
  readonly policy?: PolicyChangeDto;

  @NestedUnionList(STAGE, { maximum: LIST_LIMITS.stages, tooManyCode: 'too_many_stages' })
  readonly stages: readonly StageDto[];

  @NestedUnionList(DEVICE, {
    maximum: LIST_LIMITS.devices,
    optional: true,
    description: 'Unsaved devices; all others are taken from the library',
  })
  readonly devices?: readonly DeviceInputDto[];

  @Currency()
  readonly currency: string;

  @Quantity('quantity', { description: 'Boards per build' })
  readonly buildQuantity: number;
}

@ApiSchema({ name: 'CalculationRequest' })
export class CalculationRequestDto extends ChainInputDto {
  @Nested(() => CalculationIncludeDto, { optional: true })
  readonly include?: CalculationIncludeDto;
}

@ApiSchema({ name: 'CalculationResult' })
export class CalculationResultDto {
  @ApiProperty({ type: () => ChainReportDto }) readonly report: ChainReportDto;
  @ApiProperty({ type: () => CurvesDto, nullable: true }) readonly curves: CurvesDto | null;
  @ApiProperty({ type: () => WorkingDto, nullable: true }) readonly working: WorkingDto | null;
}

@ApiSchema({ name: 'CandidatesRequest' })
export class CandidatesRequestDto extends ChainInputDto {
  @Uuid({ description: 'The stage that devices are tried in' })
  readonly stageId: string;

  @IdList({ maximum: 2000, optional: true, description: 'Absent: every device of the kind that fits the stage' })
  readonly deviceIds?: readonly string[];
}
