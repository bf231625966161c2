import { ApiSchema } from '@nestjs/swagger';
import { Choice } from '../../common/fields/choice';
import { Nested, NestedUnion } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { declareUnion } from '../../common/fields/union';
import type {
  Band,
  CurrentSource,
  GainBasis,
  LevelKind,
  Load,
  Requirements,
  Source,
  Specification,
  Supply,
  VoltageSource,
} from '../engine';

@ApiSchema({ name: 'VoltageSource' })
export class VoltageSourceDto implements VoltageSource {
  @Choice(['voltage'])
  readonly kind: 'voltage';

  @Quantity('positiveResistanceOhm', { description: 'Series resistance' })
  readonly resistanceOhm: number;

  @Choice(['peak-emf', 'rms-emf', 'available-power'], { name: 'LevelKind' })
  readonly levelKind: LevelKind;

  @Quantity('sourceLevel', { optional: true, description: 'V peak, V rms or dBm as `levelKind` says' })
  readonly nominalLevel?: number;

  @Quantity('sourceLevel', { optional: true, description: 'V peak, V rms or dBm as `levelKind` says' })
  readonly largestLevel?: number;
}

@ApiSchema({ name: 'CurrentSource' })
export class CurrentSourceDto implements CurrentSource {
  @Choice(['current'])
  readonly kind: 'current';

  @Quantity('positiveResistanceOhm', { description: 'Shunt resistance' })
  readonly resistanceOhm: number;

  @Quantity('capacitanceF', { description: 'Shunt capacitance' })
  readonly capacitanceF: number;

  @Quantity('currentA', { optional: true, description: 'Peak' })
  readonly nominalLevel?: number;

  @Quantity('currentA', { optional: true, description: 'Peak' })
  readonly largestLevel?: number;

  @Quantity('currentA', { optional: true, description: 'Dark plus ambient current' })
  readonly dcCurrentA?: number;
}

export const SOURCE = declareUnion<Source['kind']>('Source', 'kind', {
  voltage: VoltageSourceDto,
  current: CurrentSourceDto,
});

@ApiSchema({ name: 'Load' })
export class LoadDto implements Load {
  @Quantity('positiveResistanceOhm', { nullable: true, description: 'Null: open' })
  readonly resistanceOhm: number | null;

  @Quantity('capacitanceF', { optional: true })
  readonly capacitanceF?: number;
}

@ApiSchema({ name: 'Band' })
export class BandDto implements Band {
  @Quantity('frequencyHz') readonly lowHz: number;
  @Quantity('frequencyHz') readonly operatingHz: number;
  @Quantity('frequencyHz') readonly highHz: number;
}

@ApiSchema({ name: 'Supply' })
export class SupplyDto implements Supply {
  @Quantity('positiveRailV', { description: 'Positive rail' })
  readonly positiveV: number;

  @Quantity('negativeRailV', { description: 'Negative rail; 0 = single supply' })
  readonly negativeV: number;
}

@ApiSchema({ name: 'GainRequirement' })
export class GainRequirementDto {
  @Quantity('gainDb', { description: 'dB, dBΩ for transimpedance' })
  readonly target: number;

  @Quantity('toleranceDb')
  readonly tolerance: number;
}

/** Each absent requirement is no check. */
@ApiSchema({ name: 'Requirements' })
export class RequirementsDto implements Requirements {
  @Nested(() => GainRequirementDto, { optional: true, description: 'At the operating frequency' })
  readonly gainDb?: GainRequirementDto;

  @Quantity('gainDb', { optional: true }) readonly minimumGainDb?: number;
  @Quantity('gainDb', { optional: true }) readonly maximumGainDb?: number;

  @Quantity('toleranceDb', { optional: true, description: 'Largest minus smallest gain over the band, at most' })
  readonly flatnessDb?: number;

  @Quantity('frequencyHz', { optional: true, description: 'Upper −3 dB corner of the chain at least' })
  readonly upperCornerHz?: number;

  @Quantity('frequencyHz', { optional: true, description: 'Lower −3 dB corner of the chain at most' })
  readonly lowerCornerHz?: number;

  @Quantity('gainDb', { optional: true, description: 'Loop gain of every stage at the operating frequency, at least' })
  readonly loopGainDb?: number;

  @Quantity('inputNoise', { optional: true, description: 'Added noise, V/√Hz (A/√Hz for a current source), at most' })
  readonly inputNoise?: number;

  @Quantity('noiseFigureDb', { optional: true }) readonly noiseFigureDb?: number;
  @Quantity('voltageV', { optional: true }) readonly outputOffsetV?: number;
  @Quantity('currentA', { optional: true }) readonly supplyCurrentA?: number;
  @Quantity('powerW', { optional: true }) readonly supplyPowerW?: number;

  @Quantity('costMicros', { optional: true, description: 'Amplifiers of one board, at most' })
  readonly costMicros?: number;

  @Choice(['in-phase', 'inverted'], { name: 'Polarity', optional: true })
  readonly polarity?: 'in-phase' | 'inverted';
}

@ApiSchema({ name: 'Specification' })
export class SpecificationDto implements Specification {
  @NestedUnion(SOURCE)
  readonly source: VoltageSourceDto | CurrentSourceDto;

  @Nested(() => LoadDto)
  readonly load: LoadDto;

  @Choice(['voltage', 'transducer', 'transimpedance'], { name: 'GainBasis' })
  readonly gainBasis: GainBasis;

  @Nested(() => BandDto)
  readonly band: BandDto;

  @Nested(() => SupplyDto)
  readonly supply: SupplyDto;

  @Quantity('temperatureK', { optional: true, description: 'Ambient; absent: 298.15 K' })
  readonly ambientK?: number;

  @Nested(() => RequirementsDto)
  readonly requirements: RequirementsDto;
}
