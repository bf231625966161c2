import { createParamDecorator, type ExecutionContext, Header, SetMetadata } from '@nestjs/common';
import type { Request } from 'express';
import type { Role } from './role';
import type { SessionUser } from './session-user';

export const PUBLIC_KEY = 'bandledger:public';
export const ROLES_KEY = 'bandledger:roles';
export const RATE_BUCKET_KEY = 'bandledger:rate-bucket';

export type RateBucket = 'general' | 'calculation';

/** Open to people who are not signed in. Everything else needs a session. */
export const Public = () => SetMetadata(PUBLIC_KEY, true);

/** Needs one of these roles; where the row decides, ask the policy instead. */
export const Roles = (...roles: Role[]) => SetMetadata(ROLES_KEY, roles);

/** Counts the route's requests in a bucket of its own. */
export const RateLimitBucket = (bucket: RateBucket) => SetMetadata(RATE_BUCKET_KEY, bucket);

/** Answers that must not rest in any cache. */
export const NoStore = () => Header('Cache-Control', 'no-store');

/** The signed-in person; on public routes possibly undefined. */
export const CurrentUser = createParamDecorator(
  (_data: unknown, context: ExecutionContext): SessionUser | undefined => {
    return context.switchToHttp().getRequest<Request & { user?: SessionUser }>().user;
  },
);
