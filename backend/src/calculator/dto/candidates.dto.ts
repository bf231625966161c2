import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import type { CandidateReport, CandidatesReport, Grade, StageNeed, Verdict } from '../engine';
import { FigureDto, MoneyDto, VERDICTS } from './figure.dto';

const VERDICT = { enum: VERDICTS, enumName: 'Verdict' };

/** One line of what a device in this place must bring. */
@ApiSchema({ name: 'StageNeed' })
export class StageNeedDto implements StageNeed {
  @ApiProperty() readonly id: string;
  @ApiProperty() readonly text: string;
  @ApiProperty({ type: () => FigureDto, nullable: true }) readonly figure: FigureDto | null;
  @ApiProperty({ type: () => MoneyDto, nullable: true }) readonly money: MoneyDto | null;
}

/** A device tried in this very stage. */
@ApiSchema({ name: 'CandidateReport' })
export class CandidateReportDto implements CandidateReport {
  @ApiProperty() readonly deviceId: string;
  @ApiProperty() readonly partNumber: string;
  @ApiProperty({ enum: ['general-purpose', 'rf'], enumName: 'Grade' }) readonly grade: Grade;
  @ApiProperty() readonly current: boolean;
  @ApiProperty({ type: () => FigureDto }) readonly gbwHave: FigureDto;
  @ApiProperty({ type: () => FigureDto }) readonly headroom: FigureDto;
  @ApiProperty({ type: () => FigureDto }) readonly cornerUpper: FigureDto;
  @ApiProperty({ type: () => FigureDto }) readonly droopOperating: FigureDto;
  @ApiProperty(VERDICT) readonly verdict: Verdict;
  @ApiProperty({ description: 'Why it is not clear; empty when clear' }) readonly reason: string;
  @ApiProperty(VERDICT) readonly chainVerdict: Verdict;
  @ApiProperty({ description: 'What the chain becomes' }) readonly chainText: string;
  @ApiProperty({ type: () => MoneyDto }) readonly unitCost: MoneyDto;
  @ApiProperty({ type: () => MoneyDto }) readonly chainCost: MoneyDto;
}

@ApiSchema({ name: 'CandidatesReport' })
export class CandidatesReportDto implements CandidatesReport {
  @ApiProperty() readonly stageId: string;
  @ApiProperty({ type: () => [StageNeedDto] }) readonly needs: readonly StageNeedDto[];
  @ApiProperty({ type: () => [CandidateReportDto] }) readonly candidates: readonly CandidateReportDto[];
}
