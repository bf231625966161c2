import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { CHAIN_FIGURES, STAGE_FIGURES, STAGE_KINDS } from '../engine';
import type {
  ChainCaseReport,
  ChainFigureKey,
  ChainReport,
  Figure,
  FrequencyAxis,
  GbwCase,
  Grade,
  HeadlineItem,
  StageCaseReport,
  StageFigureKey,
  StageKind,
  StageReport,
  Verdict,
} from '../engine';
import { CheckDto, DataMarkDto, LaneDto, VerdictReportDto } from './check.dto';
import { FigureDto, MoneyDto, VERDICTS } from './figure.dto';

const GBW_CASE = { enum: ['typical', 'minimum', 'minimumHot'], enumName: 'GbwCase' };
const nullable = (type: 'string' | 'number') => ({ type, nullable: true }) as const;

/** Every figure is a required property of its own, so that a misspelt key fails to compile in the screens. */
@ApiSchema({ name: 'StageFigures' })
class StageFiguresDto {}
for (const key of STAGE_FIGURES) ApiProperty({ type: () => FigureDto })(StageFiguresDto.prototype, key);

@ApiSchema({ name: 'ChainFigures' })
class ChainFiguresDto {}
for (const key of CHAIN_FIGURES) ApiProperty({ type: () => FigureDto })(ChainFiguresDto.prototype, key);

@ApiSchema({ name: 'StageCaseReport' })
export class StageCaseReportDto implements StageCaseReport {
  @ApiProperty({ type: () => StageFiguresDto }) readonly figures: Readonly<Record<StageFigureKey, Figure>>;
  @ApiProperty({ description: 'Which datasheet value was used' }) readonly gbwBasis: string;
  @ApiProperty({ type: () => LaneDto }) readonly lane: LaneDto;
}

@ApiSchema({ name: 'StageCases' })
export class StageCasesDto implements Record<GbwCase, StageCaseReport> {
  @ApiProperty({ type: () => StageCaseReportDto }) readonly typical: StageCaseReportDto;
  @ApiProperty({ type: () => StageCaseReportDto }) readonly minimum: StageCaseReportDto;
  @ApiProperty({ type: () => StageCaseReportDto }) readonly minimumHot: StageCaseReportDto;
}

@ApiSchema({ name: 'StageReport' })
export class StageReportDto implements StageReport {
  @ApiProperty() readonly stageId: string;
  @ApiProperty({ description: 'S1, S2 …' }) readonly label: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ enum: STAGE_KINDS, enumName: 'StageKind' })
  readonly kind: StageKind;
  @ApiProperty(nullable('string')) readonly topology: string | null;
  @ApiProperty(nullable('string')) readonly deviceId: string | null;
  @ApiProperty(nullable('string')) readonly partNumber: string | null;
  @ApiProperty({ enum: ['general-purpose', 'rf'], enumName: 'Grade', nullable: true }) readonly grade: Grade | null;
  @ApiProperty() readonly hasGbw: boolean;
  @ApiProperty() readonly operatingHz: number;
  @ApiProperty({ type: () => VerdictReportDto }) readonly verdict: VerdictReportDto;
  @ApiProperty({ type: () => [CheckDto] }) readonly checks: readonly CheckDto[];
  @ApiProperty({ type: () => [DataMarkDto] }) readonly marks: readonly DataMarkDto[];
  @ApiProperty({ type: () => MoneyDto }) readonly unitCost: MoneyDto;
  @ApiProperty({ type: () => StageCasesDto }) readonly cases: StageCasesDto;
}

@ApiSchema({ name: 'ChainCaseReport' })
export class ChainCaseReportDto implements ChainCaseReport {
  @ApiProperty({ type: () => ChainFiguresDto }) readonly figures: Readonly<Record<ChainFigureKey, Figure>>;
  @ApiProperty({ type: () => LaneDto }) readonly lane: LaneDto;
  @ApiProperty(nullable('string')) readonly worstHeadroomStageId: string | null;
  @ApiProperty(nullable('number')) readonly worstHeadroomHz: number | null;
  @ApiProperty(nullable('number')) readonly worstDroopHz: number | null;
}

@ApiSchema({ name: 'ChainCases' })
export class ChainCasesDto implements Record<GbwCase, ChainCaseReport> {
  @ApiProperty({ type: () => ChainCaseReportDto }) readonly typical: ChainCaseReportDto;
  @ApiProperty({ type: () => ChainCaseReportDto }) readonly minimum: ChainCaseReportDto;
  @ApiProperty({ type: () => ChainCaseReportDto }) readonly minimumHot: ChainCaseReportDto;
}

/** One of the headline figures with its requirement beside it. */
@ApiSchema({ name: 'HeadlineItem' })
export class HeadlineItemDto implements HeadlineItem {
  @ApiProperty({ enum: ['gain', 'flatness', 'bandwidth', 'headroom', 'noise', 'cost'], enumName: 'HeadlineKey' })
  readonly key: HeadlineItem['key'];
  @ApiProperty() readonly label: string;
  @ApiProperty({ type: () => FigureDto, nullable: true }) readonly figure: FigureDto | null;
  @ApiProperty({ type: () => MoneyDto, nullable: true }) readonly money: MoneyDto | null;
  @ApiProperty({ enum: VERDICTS, enumName: 'Verdict', nullable: true, description: 'Null: nothing is required' })
  readonly verdict: Verdict | null;
  @ApiProperty() readonly requirement: string;
  @ApiProperty({ enum: [...CHAIN_FIGURES], enumName: 'ChainFigureKey', nullable: true })
  readonly chainFigure: ChainFigureKey | null;
}

@ApiSchema({ name: 'Headline' })
export class HeadlineDto implements Record<GbwCase, readonly HeadlineItem[]> {
  @ApiProperty({ type: () => [HeadlineItemDto] }) readonly typical: readonly HeadlineItemDto[];
  @ApiProperty({ type: () => [HeadlineItemDto] }) readonly minimum: readonly HeadlineItemDto[];
  @ApiProperty({ type: () => [HeadlineItemDto] }) readonly minimumHot: readonly HeadlineItemDto[];
}

@ApiSchema({ name: 'FrequencyAxis' })
export class FrequencyAxisDto implements FrequencyAxis {
  @ApiProperty() readonly fromHz: number;
  @ApiProperty() readonly toHz: number;
}

@ApiSchema({ name: 'ChainReport' })
export class ChainReportDto implements ChainReport {
  @ApiProperty() readonly calculatorVersion: string;
  @ApiProperty({ ...GBW_CASE, description: "The project's case: verdicts stay on it" }) readonly gbwCase: GbwCase;
  @ApiProperty({ type: () => VerdictReportDto }) readonly verdict: VerdictReportDto;
  @ApiProperty({ type: () => [CheckDto] }) readonly checks: readonly CheckDto[];
  @ApiProperty({ type: () => [StageReportDto] }) readonly stages: readonly StageReportDto[];
  @ApiProperty({ type: () => ChainCasesDto }) readonly cases: ChainCasesDto;
  @ApiProperty({ type: () => HeadlineDto }) readonly headline: HeadlineDto;
  @ApiProperty({ type: () => FrequencyAxisDto }) readonly axis: FrequencyAxisDto;
  @ApiProperty({ enum: ['in-phase', 'inverted'], enumName: 'Polarity' }) readonly polarity: 'in-phase' | 'inverted';
  @ApiProperty({ type: () => MoneyDto }) readonly cost: MoneyDto;
  @ApiProperty({ description: 'Which gain basis the chain figures are in' }) readonly gainBasisText: string;
}
