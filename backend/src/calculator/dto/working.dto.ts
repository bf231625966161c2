import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import type { GbwCase, Working, WorkingDatum, WorkingStep } from '../engine';

@ApiSchema({ name: 'WorkingStep' })
export class WorkingStepDto implements WorkingStep {
  @ApiProperty() readonly formula: string;
  @ApiProperty() readonly substituted: string;
  @ApiProperty() readonly result: string;
}

@ApiSchema({ name: 'WorkingDatum' })
export class WorkingDatumDto implements WorkingDatum {
  @ApiProperty() readonly label: string;
  @ApiProperty() readonly value: string;
  @ApiProperty({ description: 'Device and column, the set-up, the specification or the policy' })
  readonly origin: string;
  @ApiProperty() readonly assumed: boolean;
  @ApiProperty({ required: false }) readonly page?: string;
  @ApiProperty({ required: false }) readonly condition?: string;
}

/** How a figure came about. */
@ApiSchema({ name: 'Working' })
export class WorkingDto implements Working {
  @ApiProperty() readonly title: string;
  @ApiProperty({ enum: ['typical', 'minimum', 'minimumHot'], enumName: 'GbwCase' }) readonly gbwCase: GbwCase;
  @ApiProperty() readonly result: string;
  @ApiProperty({ type: () => [WorkingStepDto] }) readonly steps: readonly WorkingStepDto[];
  @ApiProperty({ type: () => [WorkingDatumDto] }) readonly data: readonly WorkingDatumDto[];
  @ApiProperty({ type: [String] }) readonly assumptions: readonly string[];
  @ApiProperty({ type: [String] }) readonly validity: readonly string[];
  @ApiProperty() readonly source: string;
}
