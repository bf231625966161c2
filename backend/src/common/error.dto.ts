import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

export class FieldErrorDto {
  @ApiProperty({ example: 'stages.0.feedbackOhm' })
  path: string;

  @ApiProperty({ example: 'out_of_range' })
  code: string;

  @ApiProperty()
  message: string;
}

/** The one shape of every answer that is not a success. */
export class ErrorDto {
  @ApiProperty({ example: 'invalid' })
  code: string;

  @ApiProperty()
  message: string;

  @ApiPropertyOptional({ type: [FieldErrorDto] })
  fieldErrors?: FieldErrorDto[];

  @ApiProperty()
  requestId: string;

  @ApiPropertyOptional({ type: 'object', additionalProperties: true, description: 'stale_version: the current row' })
  current?: Record<string, unknown>;

  @ApiPropertyOptional({
    type: 'array',
    items: { type: 'object', additionalProperties: true },
    description: 'in_use: the places that are visible to you',
  })
  where?: Record<string, unknown>[];

  @ApiPropertyOptional({ description: 'in_use: how many further places are hidden from you' })
  hiddenCount?: number;

  @ApiPropertyOptional({ description: 'Seconds to wait before trying again' })
  retryAfterSeconds?: number;
}
