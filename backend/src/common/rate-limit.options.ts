import type { ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { ThrottlerModuleOptions } from '@nestjs/throttler';
import type { Runtime } from '../config/runtime';
import { RATE_BUCKET_KEY, type RateBucket } from './decorators';

const MINUTE_MS = 60_000;

/** Two buckets; a route counts in exactly one of them. */
export function rateLimitOptions(runtime: Runtime): ThrottlerModuleOptions {
  const reflector = new Reflector();
  const unlessIn = (bucket: RateBucket) => (context: ExecutionContext) => {
    const chosen = reflector.getAllAndOverride<RateBucket | undefined>(RATE_BUCKET_KEY, [
      context.getHandler(),
      context.getClass(),
    ]);
    return (chosen ?? 'general') !== bucket;
  };
  const { rateGeneralPerMinute, rateCalculationsPerMinute } = runtime.config;
  return [
    { name: 'general', setHeaders: false, limit: rateGeneralPerMinute, ttl: MINUTE_MS, skipIf: unlessIn('general') },
    {
      name: 'calculation',
      setHeaders: false,
      limit: rateCalculationsPerMinute,
      ttl: MINUTE_MS,
      skipIf: unlessIn('calculation'),
    },
  ];
}
