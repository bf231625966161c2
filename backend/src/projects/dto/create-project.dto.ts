import { ApiSchema } from '@nestjs/swagger';
import { Flag } from '../../common/fields/choice';
import { IdList } from '../../common/fields/nested';
import { Quantity } from '../../common/fields/quantity';
import { Currency, Text } from '../../common/fields/text';
import { LIST_LIMITS, TEXT_LIMITS } from '../../common/limits';

@ApiSchema({ name: 'CreateProject' })
export class CreateProjectDto {
  @Text({ maximum: TEXT_LIMITS.code, description: 'Short code, e.g. PW-5' })
  readonly code: string;

  @Text({ maximum: TEXT_LIMITS.name })
  readonly name: string;

  @Text({ maximum: TEXT_LIMITS.description, multiline: true, empty: true, optional: true })
  readonly description?: string;

  @Flag({ description: 'Open to the team; false: only its members see it' })
  readonly open: boolean;

  @Currency()
  readonly currency: string;

  @Quantity('quantity', { description: 'Boards per build' })
  readonly buildQuantity: number;

  @IdList({ maximum: LIST_LIMITS.members, optional: true, description: 'Who creates it is a member in any case' })
  readonly memberIds?: readonly string[];
}
