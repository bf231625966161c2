import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { FigureDto, MoneyDto, VERDICTS } from '../../calculator/dto/figure.dto';
import type { Verdict } from '../../calculator/engine';

/** What lists show of an option, computed from its stages as they are stored. */
@ApiSchema({ name: 'OptionSummary' })
export class OptionSummaryDto {
  @ApiProperty({ enum: VERDICTS, enumName: 'Verdict' }) readonly verdict: Verdict;
  @ApiProperty() readonly lead: string;
  @ApiProperty() readonly text: string;
  @ApiProperty({ type: () => FigureDto }) readonly worstHeadroom: FigureDto;
  @ApiProperty({ type: 'string', nullable: true, description: 'Label and name, e.g. "S2 Gain"' })
  readonly worstHeadroomStage: string | null;
  @ApiProperty({ type: () => FigureDto, description: 'At the operating frequency' }) readonly gain: FigureDto;
  @ApiProperty({ type: () => MoneyDto }) readonly cost: MoneyDto;
  @ApiProperty({ type: () => MoneyDto, nullable: true }) readonly costLimit: MoneyDto | null;
  @ApiProperty({ required: false, description: 'Why it could not be calculated' }) readonly reason?: string;
}
