import { ApiProperty, ApiSchema, IntersectionType } from '@nestjs/swagger';
import type { DeviceKind } from '../../calculator/engine';
import { declareUnion } from '../../common/fields/union';
import { DatasheetDto } from './device-body.dto';
import { CurrentFeedbackFieldsDto, MatchedBlockFieldsDto, VoltageFeedbackFieldsDto } from './device-fields.dto';
import { QuoteDto } from './quote.dto';

@ApiSchema({ name: 'PersonRef' })
export class PersonRefDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly name: string;
}

@ApiSchema({ name: 'DeviceRights' })
export class DeviceRightsDto {
  @ApiProperty() readonly edit: boolean;
  @ApiProperty() readonly delete: boolean;
  @ApiProperty({ description: 'False for whoever entered or last edited the values' }) readonly verify: boolean;
  @ApiProperty() readonly editQuote: boolean;
}

class LibraryRowDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty() readonly verified: boolean;
  @ApiProperty({ type: () => QuoteDto, required: false }) readonly quote?: QuoteDto;
  @ApiProperty({ type: 'integer', description: 'Version of the quote; 0 without one' }) readonly quoteVersion: number;
  @ApiProperty({ type: () => DatasheetDto, required: false }) readonly datasheet?: DatasheetDto;
  @ApiProperty({ format: 'date', required: false }) readonly lifecycleDate?: string;
  @ApiProperty({ required: false }) readonly notes?: string;
  @ApiProperty({ type: () => PersonRefDto }) readonly enteredBy: PersonRefDto;
  @ApiProperty({ type: () => PersonRefDto, nullable: true }) readonly verifiedBy: PersonRefDto | null;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => DeviceRightsDto }) readonly can: DeviceRightsDto;
}

@ApiSchema({ name: 'VoltageFeedbackLibraryDevice' })
export class VoltageFeedbackLibraryDeviceDto extends IntersectionType(VoltageFeedbackFieldsDto, LibraryRowDto) {}

@ApiSchema({ name: 'CurrentFeedbackLibraryDevice' })
export class CurrentFeedbackLibraryDeviceDto extends IntersectionType(CurrentFeedbackFieldsDto, LibraryRowDto) {}

@ApiSchema({ name: 'MatchedBlockLibraryDevice' })
export class MatchedBlockLibraryDeviceDto extends IntersectionType(MatchedBlockFieldsDto, LibraryRowDto) {}

export type LibraryDeviceDto =
  VoltageFeedbackLibraryDeviceDto | CurrentFeedbackLibraryDeviceDto | MatchedBlockLibraryDeviceDto;

/** A device of the library as it is answered. */
export const LIBRARY_DEVICE = declareUnion<DeviceKind>('LibraryDevice', 'kind', {
  'voltage-feedback': VoltageFeedbackLibraryDeviceDto,
  'current-feedback': CurrentFeedbackLibraryDeviceDto,
  'matched-block': MatchedBlockLibraryDeviceDto,
});
