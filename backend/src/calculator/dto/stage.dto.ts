import { ApiSchema } from '@nestjs/swagger';
import { Choice } from '../../common/fields/choice';
import type { ChoiceOptions } from '../../common/fields/choice';
import { Quantity } from '../../common/fields/quantity';
import { Text, Uuid } from '../../common/fields/text';
import { declareUnion } from '../../common/fields/union';
import { TEXT_LIMITS } from '../../common/limits';
import type {
  CurrentFeedbackStage,
  CurrentFeedbackTopology,
  MatchedBlockStage,
  RcSectionStage,
  StageKind,
  VoltageFeedbackStage,
  VoltageFeedbackTopology,
} from '../engine';

const named = (name: string): ChoiceOptions => ({ name });

abstract class StageBaseDto {
  @Uuid({ description: 'Made by whoever edits' })
  readonly id: string;

  @Text({ maximum: TEXT_LIMITS.name, empty: true })
  readonly name: string;
}

abstract class DeviceStageDto extends StageBaseDto {
  @Text({ maximum: TEXT_LIMITS.shortText, description: 'A device of the library, or one sent along' })
  readonly deviceId: string;
}

/** Resistors are the truth; the wanted gain is kept beside them. */
abstract class FeedbackStageDto extends DeviceStageDto {
  @Quantity('wantedGain', {
    optional: true,
    nullable: true,
    description: 'Signed ratio, Ω for transimpedance; null = resistors were typed',
  })
  readonly wantedGain?: number | null;

  @Quantity('resistanceOhm')
  readonly feedbackOhm: number;

  @Quantity('resistanceOhm', {
    optional: true,
    nullable: true,
    description: 'To ground (non-inverting) or from the node in front (inverting); null: open (follower) or absent',
  })
  readonly gainOhm?: number | null;

  @Quantity('capacitanceF', { optional: true, description: 'Across the feedback resistor' })
  readonly feedbackF?: number;

  @Quantity('capacitanceF', { optional: true, description: 'Stray capacitance of the inverting node to ground' })
  readonly strayF?: number;

  @Quantity('positiveResistanceOhm', { optional: true, nullable: true, description: 'Input termination to ground' })
  readonly terminationOhm?: number | null;

  @Quantity('positiveCapacitanceF', { optional: true, nullable: true, description: 'Series coupling capacitor' })
  readonly couplingF?: number | null;

  @Quantity('positiveResistanceOhm', { optional: true, nullable: true, description: 'From the + input to ground' })
  readonly biasOhm?: number | null;

  @Quantity('resistanceOhm', { optional: true, description: 'Series resistor behind the amplifier, outside the loop' })
  readonly isolationOhm?: number;
}

@ApiSchema({ name: 'VoltageFeedbackStage' })
export class VoltageFeedbackStageDto extends FeedbackStageDto implements VoltageFeedbackStage {
  @Choice(['voltage-feedback'])
  readonly kind: 'voltage-feedback';

  @Choice(['non-inverting', 'follower', 'inverting', 'transimpedance'], named('VoltageFeedbackTopology'))
  readonly topology: VoltageFeedbackTopology;
}

@ApiSchema({ name: 'CurrentFeedbackStage' })
export class CurrentFeedbackStageDto extends FeedbackStageDto implements CurrentFeedbackStage {
  @Choice(['current-feedback'])
  readonly kind: 'current-feedback';

  @Choice(['non-inverting', 'inverting'], named('CurrentFeedbackTopology'))
  readonly topology: CurrentFeedbackTopology;
}

/** Passive section from left to right: series R, series C, then shunt R and shunt C to ground. */
@ApiSchema({ name: 'RcSectionStage' })
export class RcSectionStageDto extends StageBaseDto implements RcSectionStage {
  @Choice(['rc-section'])
  readonly kind: 'rc-section';

  @Quantity('resistanceOhm', { optional: true })
  readonly seriesOhm?: number;

  @Quantity('positiveCapacitanceF', { optional: true, nullable: true })
  readonly seriesF?: number | null;

  @Quantity('positiveResistanceOhm', { optional: true, nullable: true })
  readonly shuntOhm?: number | null;

  @Quantity('capacitanceF', { optional: true })
  readonly shuntF?: number;
}

@ApiSchema({ name: 'MatchedBlockStage' })
export class MatchedBlockStageDto extends DeviceStageDto implements MatchedBlockStage {
  @Choice(['matched-block'])
  readonly kind: 'matched-block';
}

export type StageDto = VoltageFeedbackStageDto | CurrentFeedbackStageDto | RcSectionStageDto | MatchedBlockStageDto;

export const STAGE = declareUnion<StageKind>('Stage', 'kind', {
  'voltage-feedback': VoltageFeedbackStageDto,
  'current-feedback': CurrentFeedbackStageDto,
  'rc-section': RcSectionStageDto,
  'matched-block': MatchedBlockStageDto,
});
