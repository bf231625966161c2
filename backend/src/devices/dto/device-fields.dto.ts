import { ApiSchema } from '@nestjs/swagger';
import type { DatasheetValue, Grade, Lifecycle } from '../../calculator/engine';
import { Choice } from '../../common/fields/choice';
import { Quantity } from '../../common/fields/quantity';
import { Text } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { DatasheetQuantity } from './datasheet-value.dto';

export const GRADES: readonly Grade[] = ['general-purpose', 'rf'];
export const LIFECYCLES: readonly Lifecycle[] = ['active', 'not-recommended', 'last-time-buy', 'obsolete'];

/** What every kind of device has. */
export abstract class DeviceFieldsDto {
  @Text({ maximum: TEXT_LIMITS.partNumber, description: 'The exact orderable part number' })
  readonly partNumber: string;

  @Text({ maximum: TEXT_LIMITS.name, optional: true })
  readonly maker?: string;

  @Choice(GRADES, { name: 'Grade' })
  readonly grade: Grade;

  @Text({ maximum: TEXT_LIMITS.shortText, optional: true })
  readonly package?: string;

  @Choice(LIFECYCLES, { name: 'Lifecycle', optional: true })
  readonly lifecycle?: Lifecycle;

  @Quantity('channels', { description: 'Amplifiers or blocks in one package' })
  readonly channels: number;

  @DatasheetQuantity('voltageV', { optional: true, description: 'Total supply, positive minus negative rail' })
  readonly supplyVoltageV?: DatasheetValue;

  @DatasheetQuantity('currentA', { optional: true, description: 'Quiescent current of one amplifier or block' })
  readonly supplyCurrentA?: DatasheetValue;
}

/** What both kinds of operational amplifier have. */
export abstract class AmplifierFieldsDto extends DeviceFieldsDto {
  @DatasheetQuantity('resistanceOhm', { optional: true, description: 'Open-loop output resistance' })
  readonly outputResistanceOhm?: DatasheetValue;

  @DatasheetQuantity('positiveResistanceOhm', { optional: true, description: 'From the + input to ground' })
  readonly inputResistanceOhm?: DatasheetValue;

  @DatasheetQuantity('capacitanceF', { optional: true, description: 'From each input to ground' })
  readonly commonModeCapacitanceF?: DatasheetValue;

  @DatasheetQuantity('slewRateVPerS')
  readonly slewRateVPerS?: DatasheetValue;

  @DatasheetQuantity('voltageV', { optional: true, description: 'Closest approach of the output to the positive rail' })
  readonly headroomPositiveV?: DatasheetValue;

  @DatasheetQuantity('voltageV', { optional: true, description: 'Closest approach of the output to the negative rail' })
  readonly headroomNegativeV?: DatasheetValue;

  @DatasheetQuantity('currentA')
  readonly outputCurrentA?: DatasheetValue;

  @DatasheetQuantity('signedVoltageV')
  readonly inputOffsetVoltageV?: DatasheetValue;

  @DatasheetQuantity('voltageNoiseVPerRtHz')
  readonly voltageNoiseVPerRtHz?: DatasheetValue;

  @Quantity('noiseCornerHz', { optional: true, description: '1/f corner of the voltage noise' })
  readonly voltageNoiseCornerHz?: number;

  @Quantity('noiseCornerHz', { optional: true, description: '1/f corner of the current noise' })
  readonly currentNoiseCornerHz?: number;

  @Quantity('frequencyHz', { optional: true, description: 'Takes precedence over the phase margin' })
  readonly secondPoleHz?: number;

  @DatasheetQuantity('signedCurrentA', { optional: true, description: 'Of the + input' })
  readonly inputBiasCurrentA?: DatasheetValue;

  @DatasheetQuantity('currentNoiseAPerRtHz', { optional: true, description: 'Of the + input' })
  readonly currentNoiseAPerRtHz?: DatasheetValue;
}

@ApiSchema({ name: 'VoltageFeedbackFields' })
export class VoltageFeedbackFieldsDto extends AmplifierFieldsDto {
  @Choice(['voltage-feedback'])
  readonly kind: 'voltage-feedback';

  @DatasheetQuantity('gainBandwidthHz', { description: 'Gain-bandwidth product' })
  readonly gainBandwidthHz: DatasheetValue;

  @DatasheetQuantity('openLoopGainDb')
  readonly openLoopGainDb?: DatasheetValue;

  @Quantity('noiseGain', { optional: true, description: 'Smallest noise gain that is stable; 1 = unity-gain stable' })
  readonly minimumStableGain?: number;

  @Quantity('phaseMarginDeg', { optional: true, description: 'Quoted at the noise gain `phaseMarginGain`' })
  readonly phaseMarginDeg?: number;

  @Quantity('noiseGain', { optional: true, description: 'Absent: the minimum stable gain, else 1' })
  readonly phaseMarginGain?: number;

  @DatasheetQuantity('capacitanceF', { optional: true, description: 'Between the input pins' })
  readonly differentialCapacitanceF?: DatasheetValue;
}

@ApiSchema({ name: 'CurrentFeedbackFields' })
export class CurrentFeedbackFieldsDto extends AmplifierFieldsDto {
  @Choice(['current-feedback'])
  readonly kind: 'current-feedback';

  @DatasheetQuantity('frequencyHz', { description: '−3 dB bandwidth in the reference circuit' })
  readonly referenceBandwidthHz: DatasheetValue;

  @Quantity('noiseGain', { description: 'Noise gain of the reference circuit; a gain of −2 means 3' })
  readonly referenceNoiseGain: number;

  @Quantity('positiveResistanceOhm', { description: 'Feedback resistor of the reference circuit' })
  readonly referenceFeedbackOhm: number;

  @DatasheetQuantity('resistanceOhm', { optional: true, description: 'Looking into the inverting input' })
  readonly invertingInputResistanceOhm?: DatasheetValue;

  @DatasheetQuantity('positiveResistanceOhm')
  readonly openLoopTransimpedanceOhm?: DatasheetValue;

  @DatasheetQuantity('signedCurrentA')
  readonly invertingBiasCurrentA?: DatasheetValue;

  @DatasheetQuantity('currentNoiseAPerRtHz')
  readonly invertingCurrentNoiseAPerRtHz?: DatasheetValue;
}

@ApiSchema({ name: 'MatchedBlockFields' })
export class MatchedBlockFieldsDto extends DeviceFieldsDto {
  @Choice(['matched-block'])
  readonly kind: 'matched-block';

  @Quantity('positiveResistanceOhm', { description: 'The impedance that the block is matched to' })
  readonly impedanceOhm: number;

  @DatasheetQuantity('gainDb', { description: 'Power gain between matched terminations; negative = loss' })
  readonly gainDb: DatasheetValue;

  @DatasheetQuantity('frequencyHz', { optional: true, description: 'First-order −3 dB corner; absent: flat' })
  readonly lowerCornerHz?: DatasheetValue;

  @DatasheetQuantity('frequencyHz', { optional: true, description: 'First-order −3 dB corner; absent: flat' })
  readonly upperCornerHz?: DatasheetValue;

  @DatasheetQuantity('noiseFigureDb')
  readonly noiseFigureDb?: DatasheetValue;

  @DatasheetQuantity('powerDbm', { optional: true, description: 'Output power at 1 dB compression' })
  readonly outputP1dbDbm?: DatasheetValue;

  @DatasheetQuantity('powerDbm', { optional: true, description: 'Output third-order intercept' })
  readonly outputIp3Dbm?: DatasheetValue;
}
