import { ApiSchema, IntersectionType } from '@nestjs/swagger';
import type { DeviceKind } from '../../calculator/engine';
import { Nested } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { PlainDate, Text } from '../../common/fields/text';
import { declareUnion } from '../../common/fields/union';
import { TEXT_LIMITS } from '../../common/limits';
import { CurrentFeedbackFieldsDto, MatchedBlockFieldsDto, VoltageFeedbackFieldsDto } from './device-fields.dto';

@ApiSchema({ name: 'Datasheet' })
export class DatasheetDto {
  @Text({ maximum: TEXT_LIMITS.shortText, description: 'Revision or date printed on the datasheet' })
  readonly revision: string;

  @Text({ maximum: TEXT_LIMITS.name, optional: true })
  readonly title?: string;
}

/** What the library keeps beside the values. */
class LibraryFieldsDto {
  @Nested(() => DatasheetDto, { optional: true })
  readonly datasheet?: DatasheetDto;

  @PlainDate({ optional: true, description: 'When the lifecycle was looked up' })
  readonly lifecycleDate?: string;

  @Text({ maximum: TEXT_LIMITS.description, multiline: true, optional: true })
  readonly notes?: string;
}

class VersionDto {
  @Quantity('version', { description: 'The version that was read' })
  readonly version: number;
}

@ApiSchema({ name: 'VoltageFeedbackDeviceBody' })
export class VoltageFeedbackDeviceBodyDto extends IntersectionType(VoltageFeedbackFieldsDto, LibraryFieldsDto) {}

@ApiSchema({ name: 'CurrentFeedbackDeviceBody' })
export class CurrentFeedbackDeviceBodyDto extends IntersectionType(CurrentFeedbackFieldsDto, LibraryFieldsDto) {}

@ApiSchema({ name: 'MatchedBlockDeviceBody' })
export class MatchedBlockDeviceBodyDto extends IntersectionType(MatchedBlockFieldsDto, LibraryFieldsDto) {}

@ApiSchema({ name: 'VoltageFeedbackDeviceUpdate' })
export class VoltageFeedbackDeviceUpdateDto extends IntersectionType(VoltageFeedbackDeviceBodyDto, VersionDto) {}

@ApiSchema({ name: 'CurrentFeedbackDeviceUpdate' })
export class CurrentFeedbackDeviceUpdateDto extends IntersectionType(CurrentFeedbackDeviceBodyDto, VersionDto) {}

@ApiSchema({ name: 'MatchedBlockDeviceUpdate' })
export class MatchedBlockDeviceUpdateDto extends IntersectionType(MatchedBlockDeviceBodyDto, VersionDto) {}

export type DeviceBodyDto = VoltageFeedbackDeviceBodyDto | CurrentFeedbackDeviceBodyDto | MatchedBlockDeviceBodyDto;
export type DeviceUpdateDto =
  VoltageFeedbackDeviceUpdateDto | CurrentFeedbackDeviceUpdateDto | MatchedBlockDeviceUpdateDto;

export const DEVICE_BODY = declareUnion<DeviceKind>('DeviceBody', 'kind', {
  'voltage-feedback': VoltageFeedbackDeviceBodyDto,
  'current-feedback': CurrentFeedbackDeviceBodyDto,
  'matched-block': MatchedBlockDeviceBodyDto,
});

export const DEVICE_UPDATE = declareUnion<DeviceKind>('DeviceUpdate', 'kind', {
  'voltage-feedback': VoltageFeedbackDeviceUpdateDto,
  'current-feedback': CurrentFeedbackDeviceUpdateDto,
  'matched-block': MatchedBlockDeviceUpdateDto,
});

/** The kind of a device never changes; with its version this is all that both routes share. */
@ApiSchema({ name: 'Version' })
export class VersionBodyDto extends VersionDto {}
