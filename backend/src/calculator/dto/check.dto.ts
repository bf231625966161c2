import { ApiProperty, ApiSchema, getSchemaPath } from '@nestjs/swagger';
import { membersOf } from '../../common/fields/choice';
import { CHECK_IDS } from '../engine';
import type { Check, CheckId, DataMark, Lane, Remedy, Stage, Verdict, VerdictReport } from '../engine';
import { FigureDto, VERDICTS } from './figure.dto';

const nullableNumber = (description?: string) => ({ type: 'number', nullable: true, description }) as const;

@ApiSchema({ name: 'Remedy' })
export class RemedyDto implements Remedy {
  @ApiProperty() readonly sentence: string;
  @ApiProperty({ enum: VERDICTS, enumName: 'Verdict' }) readonly verdict: Verdict;
  @ApiProperty({ required: false, description: 'Label of a button that applies it' }) readonly action?: string;
  @ApiProperty({
    type: 'array',
    items: { $ref: getSchemaPath('Stage') },
    required: false,
    description: 'Replace the stage as a whole',
  })
  readonly stages?: readonly Stage[];
}

@ApiSchema({ name: 'Check' })
export class CheckDto implements Check {
  @ApiProperty({ enum: [...CHECK_IDS], enumName: 'CheckId' }) readonly id: CheckId;
  @ApiProperty() readonly title: string;
  @ApiProperty({ enum: VERDICTS, enumName: 'Verdict' }) readonly verdict: Verdict;
  @ApiProperty({ type: () => FigureDto, nullable: true }) readonly actual: FigureDto | null;
  @ApiProperty({ type: () => FigureDto, nullable: true }) readonly limit: FigureDto | null;
  @ApiProperty() readonly sentence: string;
  @ApiProperty({ type: () => [RemedyDto] }) readonly remedies: readonly RemedyDto[];
}

@ApiSchema({ name: 'VerdictReport' })
export class VerdictReportDto implements VerdictReport {
  @ApiProperty({ enum: VERDICTS, enumName: 'Verdict' }) readonly verdict: Verdict;
  @ApiProperty() readonly lead: string;
  @ApiProperty() readonly text: string;
  @ApiProperty({ enum: [...CHECK_IDS], enumName: 'CheckId', nullable: true }) readonly checkId: CheckId | null;
  @ApiProperty({ type: 'string', nullable: true }) readonly stageId: string | null;
}

const MARK_KINDS = membersOf<DataMark['kind']>({
  assumed: true,
  'typical-only': true,
  'not-verified': true,
  lifecycle: true,
  'quote-lapsed': true,
  caution: true,
});

/** A mark beside the verdict that never changes it. */
@ApiSchema({ name: 'DataMark' })
export class DataMarkDto implements DataMark {
  @ApiProperty({ enum: MARK_KINDS, enumName: 'DataMarkKind' }) readonly kind: DataMark['kind'];
  @ApiProperty() readonly text: string;
}

/** A row on the shared frequency axis. */
@ApiSchema({ name: 'Lane' })
export class LaneDto implements Lane {
  @ApiProperty(nullableNumber()) readonly lowerHz: number | null;
  @ApiProperty(nullableNumber('Solid to here: the target is still met')) readonly solidToHz: number | null;
  @ApiProperty(nullableNumber('Where the device runs out, or the −3 dB corner')) readonly cornerHz: number | null;
  @ApiProperty(nullableNumber('The same for the typical device')) readonly typicalCornerHz: number | null;
  @ApiProperty() readonly bandLowHz: number;
  @ApiProperty() readonly bandHighHz: number;
  @ApiProperty({ description: 'One sentence for screen readers' }) readonly description: string;
}
