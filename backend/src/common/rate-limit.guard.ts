import { type ExecutionContext, Injectable } from '@nestjs/common';
import { ThrottlerGuard, type ThrottlerLimitDetail } from '@nestjs/throttler';
import type { Request } from 'express';
import { TooManyRequestsError } from './errors';

/** Counts by person when signed in, else by address, over all routes of a bucket together. */
@Injectable()
export class RateLimitGuard extends ThrottlerGuard {
  protected override getTracker(request: Request): Promise<string> {
    const userId = request.session?.user?.id;
    return Promise.resolve(userId === undefined ? `address:${request.ip ?? 'unknown'}` : `user:${userId}`);
  }

  protected override generateKey(_context: ExecutionContext, tracker: string, bucket: string): string {
    return `${bucket}:${tracker}`;
  }

  protected override throwThrottlingException(_context: ExecutionContext, detail: ThrottlerLimitDetail): Promise<void> {
    const seconds = Math.max(1, Math.ceil(detail.timeToBlockExpire));
    throw new TooManyRequestsError('too_many_requests', `Too many requests. Try again in ${seconds} s.`, seconds);
  }
}
