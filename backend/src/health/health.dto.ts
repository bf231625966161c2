import { ApiProperty } from '@nestjs/swagger';

export class HealthDto {
  @ApiProperty({ enum: ['ok'] })
  status: 'ok';

  @ApiProperty({ enum: ['ok'] })
  database: 'ok';

  @ApiProperty({ example: '0.1.0' })
  version: string;
}
