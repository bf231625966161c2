import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import type { CurveCase, Curves, GbwCase } from '../engine';

const NULLABLE_NUMBERS = { type: 'array', items: { type: 'number', nullable: true } } as const;

@ApiSchema({ name: 'CurveCase' })
export class CurveCaseDto implements CurveCase {
  @ApiProperty(NULLABLE_NUMBERS) readonly gainDb: readonly (number | null)[];
  @ApiProperty(NULLABLE_NUMBERS) readonly phaseDeg: readonly (number | null)[];
}

@ApiSchema({ name: 'CurveCases' })
export class CurveCasesDto implements Record<GbwCase, CurveCase> {
  @ApiProperty({ type: () => CurveCaseDto }) readonly typical: CurveCaseDto;
  @ApiProperty({ type: () => CurveCaseDto }) readonly minimum: CurveCaseDto;
  @ApiProperty({ type: () => CurveCaseDto }) readonly minimumHot: CurveCaseDto;
}

@ApiSchema({ name: 'StageCurves' })
export class StageCurvesDto {
  @ApiProperty() readonly stageId: string;
  @ApiProperty() readonly label: string;
  @ApiProperty({ type: 'number', nullable: true }) readonly idealGainDb: number | null;
  @ApiProperty({ type: () => CurveCasesDto }) readonly cases: CurveCasesDto;
}

@ApiSchema({ name: 'Curves' })
export class CurvesDto implements Curves {
  @ApiProperty({ type: [Number] }) readonly frequenciesHz: readonly number[];
  @ApiProperty({ type: () => CurveCasesDto }) readonly chain: CurveCasesDto;
  @ApiProperty({ type: 'number', nullable: true }) readonly idealGainDb: number | null;
  @ApiProperty({ type: () => [StageCurvesDto] }) readonly stages: readonly StageCurvesDto[];
}
