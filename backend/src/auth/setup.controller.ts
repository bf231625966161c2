import { Body, Controller, Post, Req } from '@nestjs/common';
import { ApiCreatedResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { NoStore, Public } from '../common/decorators';
import { AuthService } from './auth.service';
import { SignedInDto } from './dto/session.dto';
import { SetupDto } from './dto/sign-in.dto';
import { SignInService } from './sign-in.service';

@ApiTags('setup')
@Controller('setup')
export class SetupController {
  constructor(
    private readonly auth: AuthService,
    private readonly signIn: SignInService,
  ) {}

  /** Makes the first administrator, once. */
  @Public()
  @NoStore()
  @Post()
  @ApiCreatedResponse({ type: SignedInDto })
  async create(@Req() request: Request, @Body() dto: SetupDto): Promise<SignedInDto> {
    const user = await this.auth.setUp(dto, request.ip ?? 'unknown');
    return this.signIn.start(request, user, 'setup');
  }
}
