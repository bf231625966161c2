import { createHash, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { ForbiddenError, NotFoundError, UnauthenticatedError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { Runtime } from '../config/runtime';
import { AccountsService } from '../users/accounts.service';
import type { Account } from '../users/account';
import { PasswordHasher } from '../users/password-hasher';
import type { LinkOwnerDto, SessionDto } from './dto/session.dto';
import type { SetupDto } from './dto/sign-in.dto';
import { SignInLimiter } from './sign-in-limiter';

const SETUP_ACCOUNT = 'first administrator';

function sameText(a: string, b: string): boolean {
  const digest = (text: string) => createHash('sha256').update(text).digest();
  return timingSafeEqual(digest(a), digest(b));
}

/** The ways to become somebody: password, demo, set-up and one-time link. */
@Injectable()
export class AuthService {
  constructor(
    private readonly accounts: AccountsService,
    private readonly hasher: PasswordHasher,
    private readonly limiter: SignInLimiter,
    private readonly runtime: Runtime,
  ) {}

  async describe(user: SessionUser | undefined): Promise<SessionDto> {
    const { demo, config } = this.runtime;
    const demoAccounts = demo ? await this.accounts.findDemoAccounts() : [];
    return {
      user: user === undefined ? null : { ...user, roles: [...user.roles] },
      demo,
      setupNeeded: !demo && !(await this.accounts.exist()),
      demoAccounts: demoAccounts.map(({ id, name, roles, title }) => ({
        userId: id,
        name,
        roles: [...roles],
        title: title ?? '',
      })),
      version: config.version,
    };
  }

  /** The account for a mail address and password; unknown, deactivated and wrong take the same time and answer. */
  async verifyPassword(email: string, password: string, address: string): Promise<Account> {
    this.limiter.assertAllowed(email, address);
    const user = await this.accounts.findByEmail(email);
    const matches = await this.hasher.verify(password, user?.passwordHash ?? null);
    if (user === null || !matches || !user.active) {
      this.limiter.recordFailure(email, address);
      throw new UnauthenticatedError('Mail address or password is wrong.', 'invalid_credentials');
    }
    this.limiter.recordSuccess(email, address);
    return user;
  }

  async findDemoAccount(userId: string): Promise<Account> {
    if (!this.runtime.demo) throw new NotFoundError();
    const user = await this.accounts.findActive(userId);
    if (user === null || !user.isDemo) throw new NotFoundError();
    return user;
  }

  async setUp(dto: SetupDto, address: string): Promise<Account> {
    const expected = this.runtime.setupToken;
    if (expected === null || (await this.accounts.exist())) throw new NotFoundError();
    this.limiter.assertAllowed(SETUP_ACCOUNT, address);
    if (!sameText(dto.token, expected)) {
      this.limiter.recordFailure(SETUP_ACCOUNT, address);
      throw new ForbiddenError('This is not the set-up token.', 'wrong_setup_token');
    }
    return this.accounts.createFirstAdmin(dto.name, dto.email, dto.password);
  }

  async getLinkOwner(token: string): Promise<LinkOwnerDto> {
    const user = await this.accounts.findByLink(token);
    if (user === null) throw new NotFoundError('This link has been used, has run out or never existed.');
    return { name: user.name, email: user.email };
  }

  async choosePassword(token: string, password: string): Promise<Account> {
    const user = await this.accounts.setPasswordByLink(token, password);
    this.limiter.forgive(user.email);
    return user;
  }
}
