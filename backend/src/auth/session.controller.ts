import { Body, Controller, Delete, Get, HttpCode, Post, Req, Res, UseGuards } from '@nestjs/common';
import { ApiBody, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { CurrentUser, NoStore, Public } from '../common/decorators';
import type { SessionUser } from '../common/session-user';
import type { Account } from '../users/account';
import { AuthService } from './auth.service';
import { SessionDto, SignedInDto } from './dto/session.dto';
import { DemoSignInDto, SignInDto } from './dto/sign-in.dto';
import { LocalAuthGuard } from './local-auth.guard';
import { SESSION_COOKIE } from '../common/session-cookie';
import { endSession } from './request-session';
import { SignInService } from './sign-in.service';

@ApiTags('session')
@Controller('session')
export class SessionController {
  constructor(
    private readonly auth: AuthService,
    private readonly signIn: SignInService,
  ) {}

  /** Who is signed in, and what the sign-in page has to offer. */
  @Public()
  @NoStore()
  @Get()
  @ApiOkResponse({ type: SessionDto })
  get(@CurrentUser() user: SessionUser | undefined): Promise<SessionDto> {
    return this.auth.describe(user);
  }

  @Public()
  @NoStore()
  @UseGuards(LocalAuthGuard)
  @HttpCode(200)
  @Post()
  @ApiBody({ type: SignInDto })
  @ApiOkResponse({ type: SignedInDto })
  create(@Req() request: Request): Promise<SignedInDto> {
    return this.signIn.start(request, request.user as Account, 'password');
  }

  /** Demo mode only: become one of the invented team without a password. */
  @Public()
  @NoStore()
  @HttpCode(200)
  @Post('demo')
  @ApiOkResponse({ type: SignedInDto })
  async createDemo(@Req() request: Request, @Body() dto: DemoSignInDto): Promise<SignedInDto> {
    return this.signIn.start(request, await this.auth.findDemoAccount(dto.userId), 'demo');
  }

  @Public()
  @HttpCode(204)
  @Delete()
  @ApiNoContentResponse()
  async remove(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await endSession(request);
    response.clearCookie(SESSION_COOKIE, { path: '/' });
  }
}
