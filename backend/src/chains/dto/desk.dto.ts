import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { FigureDto } from '../../calculator/dto/figure.dto';

@ApiSchema({ name: 'OverChain' })
export class OverChainDto {
  @ApiProperty({ format: 'uuid' }) readonly projectId: string;
  @ApiProperty() readonly projectCode: string;
  @ApiProperty({ format: 'uuid' }) readonly chainId: string;
  @ApiProperty() readonly chainName: string;
  @ApiProperty({ format: 'uuid' }) readonly optionId: string;
  @ApiProperty() readonly optionName: string;
  @ApiProperty() readonly lead: string;
  @ApiProperty() readonly text: string;
  @ApiProperty({ type: () => FigureDto }) readonly worstHeadroom: FigureDto;
  @ApiProperty({ type: 'string', nullable: true }) readonly stage: string | null;
}

@ApiSchema({ name: 'DeskCounts' })
export class DeskCountsDto {
  @ApiProperty({ type: 'integer' }) readonly projects: number;
  @ApiProperty({ type: 'integer' }) readonly chains: number;
  @ApiProperty({ type: 'integer' }) readonly devices: number;
}

@ApiSchema({ name: 'DeskItem' })
export class DeskItemDto {
  @ApiProperty() readonly title: string;
  @ApiProperty() readonly text: string;
  @ApiProperty({ description: 'Address of the screen where it is done' }) readonly path: string;
}

/** What waits for the person who asks. */
@ApiSchema({ name: 'Desk' })
export class DeskDto {
  @ApiProperty({ type: () => [OverChainDto] }) readonly overChains: readonly OverChainDto[];
  @ApiProperty({ type: () => [DeskItemDto] }) readonly waiting: readonly DeskItemDto[];
  @ApiProperty({ type: () => DeskCountsDto }) readonly counts: DeskCountsDto;
}
