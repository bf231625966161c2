import { ApiSchema, PartialType } from '@nestjs/swagger';
import type { GbwCase, Policy } from '../../calculator/engine';
import { Choice } from '../../common/fields/choice';
import { Quantity } from '../../common/fields/quantity';

/** The team's margins. */
@ApiSchema({ name: 'Policy' })
export class PolicyDto implements Policy {
  @Choice(['typical', 'minimum', 'minimumHot'], {
    name: 'GbwCase',
    description: 'The case that verdicts are given for',
  })
  readonly gbwCase: GbwCase;

  @Quantity('derating', { description: 'Minimum GBW where only a typical value is given = typical × this' })
  readonly gbwDerating: number;

  @Quantity('temperatureFactor', { description: 'Further factor of the minimum-hot case' })
  readonly temperatureFactor: number;

  @Quantity('derating', { description: 'Minimum slew rate where only a typical value is given = typical × this' })
  readonly slewDerating: number;

  @Quantity('headroomTarget', { description: 'GBW limit is tight below this headroom' })
  readonly headroomTarget: number;

  @Quantity('headroomTarget', { description: 'Closed-loop bandwidth is tight below this multiple of the top edge' })
  readonly bandwidthTarget: number;

  @Quantity('headroomTarget', { description: 'Slew is tight below this headroom' })
  readonly slewTarget: number;

  @Quantity('marginDb', { description: 'Swing, compression and output current are tight within this of the limit' })
  readonly levelMarginDb: number;

  @Quantity('marginDb', { description: 'Noise figure is tight within this of the limit' })
  readonly noiseMarginDb: number;

  @Quantity('marginFraction', { description: 'Noise density, power and cost are tight within this part of the limit' })
  readonly budgetMargin: number;

  @Quantity('marginFraction', { description: 'Gain, flatness and corners are tight within this part of the limit' })
  readonly toleranceMargin: number;

  @Quantity('phaseMarginLimitDeg', { description: 'Phase margin below this is over' })
  readonly phaseMarginOverDeg: number;

  @Quantity('phaseMarginLimitDeg', { description: 'Phase margin below this is tight' })
  readonly phaseMarginTightDeg: number;
}

/** Any of the margins; what is absent keeps its default. */
@ApiSchema({ name: 'PolicyChange' })
export class PolicyChangeDto extends PartialType(PolicyDto, { skipNullProperties: false }) {}
