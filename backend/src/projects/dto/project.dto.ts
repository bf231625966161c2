import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import type { Policy } from '../../calculator/engine';
import { PolicyDto } from './policy.dto';

@ApiSchema({ name: 'ProjectMember' })
export class ProjectMemberDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly name: string;
}

@ApiSchema({ name: 'ProjectRights' })
export class ProjectRightsDto {
  @ApiProperty() readonly edit: boolean;
  @ApiProperty({ description: 'Lead only' }) readonly setPolicy: boolean;
  @ApiProperty() readonly createChain: boolean;
  @ApiProperty() readonly delete: boolean;
}

@ApiSchema({ name: 'ProjectListItem' })
export class ProjectListItemDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty({ description: 'Short code, e.g. PW-5' }) readonly code: string;
  @ApiProperty() readonly name: string;
  @ApiProperty({ description: 'Open to the team; false: only its members see it' }) readonly open: boolean;
  @ApiProperty({ type: 'integer' }) readonly memberCount: number;
  @ApiProperty({ type: 'integer' }) readonly chainCount: number;
  @ApiProperty({ description: 'ISO 4217' }) readonly currency: string;
  @ApiProperty({ type: 'integer', description: 'Boards per build' }) readonly buildQuantity: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => ProjectRightsDto }) readonly can: ProjectRightsDto;
}

@ApiSchema({ name: 'Project' })
export class ProjectDto {
  @ApiProperty({ format: 'uuid' }) readonly id: string;
  @ApiProperty() readonly code: string;
  @ApiProperty() readonly name: string;
  @ApiProperty() readonly description: string;
  @ApiProperty() readonly open: boolean;
  @ApiProperty({ type: () => [ProjectMemberDto] }) readonly members: readonly ProjectMemberDto[];
  @ApiProperty({ type: () => PolicyDto }) readonly policy: Policy;
  @ApiProperty({ description: 'ISO 4217' }) readonly currency: string;
  @ApiProperty({ type: 'integer' }) readonly buildQuantity: number;
  @ApiProperty({ type: 'integer', description: 'Chains of the project' }) readonly chainCount: number;
  @ApiProperty({ type: 'integer' }) readonly version: number;
  @ApiProperty({ format: 'date-time' }) readonly updatedAt: string;
  @ApiProperty({ type: () => ProjectRightsDto }) readonly can: ProjectRightsDto;
}
