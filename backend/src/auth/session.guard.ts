import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { Clock } from '../common/clock';
import { PUBLIC_KEY, ROLES_KEY } from '../common/decorators';
import { ForbiddenError, UnauthenticatedError } from '../common/errors';
import type { Role } from '../common/role';
import type { SessionUser } from '../common/session-user';
import { Runtime } from '../config/runtime';
import { AccountsService } from '../users/accounts.service';
import { toSessionUser } from '../users/account';
import { hasExpired, renewSession } from './request-session';

type RequestWithUser = Request & { user?: SessionUser };

/**
 * The global guard: no route without a session unless it is `@Public()`. The person is read anew for every request, so
 * a deactivation or a change of roles counts at once, whatever the session file says.
 */
@Injectable()
export class SessionGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly accounts: AccountsService,
    private readonly clock: Clock,
    private readonly runtime: Runtime,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<RequestWithUser>();
    const user = await this.findUser(request);
    request.user = user;
    if (this.metadata<boolean>(PUBLIC_KEY, context) === true) return true;
    if (user === undefined) throw new UnauthenticatedError();
    const roles = this.metadata<readonly Role[]>(ROLES_KEY, context);
    if (roles !== undefined && !roles.some((role) => user.roles.includes(role))) throw new ForbiddenError();
    return true;
  }

  private async findUser(request: RequestWithUser): Promise<SessionUser | undefined> {
    const identity = request.session?.user;
    const nowMs = this.clock.now().getTime();
    const { sessionIdleHours } = this.runtime.config;
    if (identity === undefined || hasExpired(request, nowMs, sessionIdleHours)) return undefined;
    const row = await this.accounts.findActive(identity.id);
    if (row === null || row.sessionEpoch !== identity.epoch) return undefined;
    renewSession(request, nowMs);
    return toSessionUser(row);
  }

  private metadata<T>(key: string, context: ExecutionContext): T | undefined {
    return this.reflector.getAllAndOverride<T | undefined>(key, [context.getHandler(), context.getClass()]);
  }
}
