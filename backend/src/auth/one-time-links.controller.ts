import { Body, Controller, Get, HttpCode, Param, Post, Req } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { NoStore, Public } from '../common/decorators';
import { AuthService } from './auth.service';
import { LinkOwnerDto, SignedInDto } from './dto/session.dto';
import { ChoosePasswordDto } from './dto/sign-in.dto';
import { SignInService } from './sign-in.service';

@ApiTags('one-time-links')
@Controller('one-time-links')
export class OneTimeLinksController {
  constructor(
    private readonly auth: AuthService,
    private readonly signIn: SignInService,
  ) {}

  /** Whose link this is, so that the page can greet them. */
  @Public()
  @NoStore()
  @Get(':token')
  @ApiOkResponse({ type: LinkOwnerDto })
  get(@Param('token') token: string): Promise<LinkOwnerDto> {
    return this.auth.getLinkOwner(token);
  }

  /** Chooses the password and signs in; the link is used up. */
  @Public()
  @NoStore()
  @HttpCode(200)
  @Post(':token')
  @ApiOkResponse({ type: SignedInDto })
  async use(
    @Req() request: Request,
    @Param('token') token: string,
    @Body() dto: ChoosePasswordDto,
  ): Promise<SignedInDto> {
    const user = await this.auth.choosePassword(token, dto.password);
    return this.signIn.start(request, user, 'link');
  }
}
