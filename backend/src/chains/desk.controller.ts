import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser } from '../common/decorators';
import type { SessionUser } from '../common/session-user';
import { DeskService } from './desk.service';
import { DeskDto } from './dto/desk.dto';

@ApiTags('desk')
@Controller('desk')
export class DeskController {
  constructor(private readonly desk: DeskService) {}

  @Get()
  @ApiOkResponse({ type: DeskDto })
  findOne(@CurrentUser() user: SessionUser): Promise<DeskDto> {
    return this.desk.findFor(user);
  }
}
