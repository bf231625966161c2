import { Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { Clock } from '../common/clock';
import { AccountsService } from '../users/accounts.service';
import { type Account, toSessionUser } from '../users/account';

import type { SignedInDto } from './dto/session.dto';
import { startSession } from './request-session';

/** Turns an account that was proved into a session, whichever way it was proved. */
@Injectable()
export class SignInService {
  constructor(
    private readonly accounts: AccountsService,
    private readonly clock: Clock,
  ) {}

  async start(request: Request, user: Account, way: 'password' | 'demo' | 'link' | 'setup'): Promise<SignedInDto> {
    await this.accounts.recordSignIn(user, way);
    await startSession(request, user, this.clock.now().getTime());
    const { roles, ...identity } = toSessionUser(user);
    return { user: { ...identity, roles: [...roles] } };
  }
}
