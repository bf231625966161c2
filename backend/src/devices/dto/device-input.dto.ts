import { ApiSchema, IntersectionType } from '@nestjs/swagger';
import type {
  CurrentFeedbackDevice,
  DeviceKind,
  MatchedBlockDevice,
  VoltageFeedbackDevice,
} from '../../calculator/engine';
import { Flag } from '../../common/fields/choice';
import { Nested } from '../../common/fields/nested';
import { Text } from '../../common/fields/text';
import { declareUnion } from '../../common/fields/union';
import { TEXT_LIMITS } from '../../common/limits';
import { CurrentFeedbackFieldsDto, MatchedBlockFieldsDto, VoltageFeedbackFieldsDto } from './device-fields.dto';
import { QuoteDto } from './quote.dto';

/** What a device brings along when it is sent inline, unsaved, to a calculation. */
class InlineDeviceDto {
  @Text({ maximum: TEXT_LIMITS.shortText, description: 'Any key; stages name it in `deviceId`' })
  readonly id: string;

  @Flag({ optional: true, description: 'A second person compared the values with the datasheet' })
  readonly verified?: boolean;

  @Nested(() => QuoteDto, { optional: true })
  readonly quote?: QuoteDto;
}

@ApiSchema({ name: 'VoltageFeedbackDevice' })
export class VoltageFeedbackDeviceDto
  extends IntersectionType(VoltageFeedbackFieldsDto, InlineDeviceDto)
  implements VoltageFeedbackDevice {}

@ApiSchema({ name: 'CurrentFeedbackDevice' })
export class CurrentFeedbackDeviceDto
  extends IntersectionType(CurrentFeedbackFieldsDto, InlineDeviceDto)
  implements CurrentFeedbackDevice {}

@ApiSchema({ name: 'MatchedBlockDevice' })
export class MatchedBlockDeviceDto
  extends IntersectionType(MatchedBlockFieldsDto, InlineDeviceDto)
  implements MatchedBlockDevice {}

export type DeviceInputDto = VoltageFeedbackDeviceDto | CurrentFeedbackDeviceDto | MatchedBlockDeviceDto;

/** A device as the calculator takes it. */
export const DEVICE = declareUnion<DeviceKind>('Device', 'kind', {
  'voltage-feedback': VoltageFeedbackDeviceDto,
  'current-feedback': CurrentFeedbackDeviceDto,
  'matched-block': MatchedBlockDeviceDto,
});
