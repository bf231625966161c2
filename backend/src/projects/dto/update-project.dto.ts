import { ApiSchema, PartialType } from '@nestjs/swagger';
import { Nested } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { CreateProjectDto } from './create-project.dto';
import { PolicyChangeDto } from './policy.dto';

@ApiSchema({ name: 'UpdateProject' })
export class UpdateProjectDto extends PartialType(CreateProjectDto, { skipNullProperties: false }) {
  @Quantity('version', { description: 'The version that was read' })
  readonly version: number;

  @Nested(() => PolicyChangeDto, { optional: true, description: 'Lead only; margins that are absent stay' })
  readonly policy?: PolicyChangeDto;
}
