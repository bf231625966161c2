import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { TooManyRequestsError } from '../common/errors';
import { Runtime } from '../config/runtime';

interface Failures {
  count: number;
  readonly endsAtMs: number;
}

const MINUTE_MS = 60_000;
/** Beyond this many keys the expired ones are swept out; an attacker must not fill the memory. */
const SWEEP_ABOVE = 5_000;
const KNOWN_PAIRS_KEPT = 20_000;

/**
 * Counts wrong passwords in fixed windows: by account and address together, by address, and by account over all
 * addresses. A window ends by itself and refused attempts do not prolong it. Somebody who has signed in from an address
 * before is not held up there by guesses from elsewhere, so nobody can be locked out for good; and a new one-time link
 * always lets in.
 */
@Injectable()
export class SignInLimiter {
  private readonly failures = new Map<string, Failures>();
  private readonly knownPairs = new Set<string>();

  constructor(
    private readonly clock: Clock,
    private readonly runtime: Runtime,
  ) {}

  /** Throws 429 when too many went wrong; call before the password is looked at. */
  assertAllowed(account: string, address: string): void {
    for (const { key, limit } of this.keys(account, address)) {
      const entry = this.current(key);
      if (entry !== undefined && entry.count >= limit) this.refuse(entry.endsAtMs);
    }
  }

  recordFailure(account: string, address: string): void {
    if (this.failures.size > SWEEP_ABOVE) this.sweep();
    for (const { key } of this.keys(account, address)) {
      const entry = this.current(key);
      if (entry !== undefined) entry.count += 1;
      else this.failures.set(key, { count: 1, endsAtMs: this.nowMs() + this.windowMs() });
    }
  }

  recordSuccess(account: string, address: string): void {
    const pair = pairKey(account, address);
    this.failures.delete(pair);
    this.knownPairs.delete(pair);
    this.knownPairs.add(pair);
    const oldest = this.knownPairs.values().next().value;
    if (this.knownPairs.size > KNOWN_PAIRS_KEPT && oldest !== undefined) this.knownPairs.delete(oldest);
  }

  /** After a new password by link nothing that went wrong before counts. */
  forgive(account: string): void {
    this.failures.delete(accountKey(account));
    for (const key of this.failures.keys()) {
      if (key.startsWith(pairKey(account, ''))) this.failures.delete(key);
    }
  }

  private keys(account: string, address: string): { key: string; limit: number }[] {
    const { signInFailuresPerAccount, signInFailuresPerAddress } = this.runtime.config;
    const pair = pairKey(account, address);
    const keys = [
      { key: pair, limit: signInFailuresPerAccount },
      { key: `address ${address}`, limit: signInFailuresPerAddress },
    ];
    if (!this.knownPairs.has(pair)) keys.push({ key: accountKey(account), limit: signInFailuresPerAddress });
    return keys;
  }

  private current(key: string): Failures | undefined {
    const entry = this.failures.get(key);
    if (entry === undefined || entry.endsAtMs > this.nowMs()) return entry;
    this.failures.delete(key);
    return undefined;
  }

  private refuse(endsAtMs: number): never {
    const seconds = Math.max(1, Math.ceil((endsAtMs - this.nowMs()) / 1000));
    const minutes = Math.ceil(seconds / 60);
    throw new TooManyRequestsError(
      'too_many_attempts',
      `Too many wrong passwords. Try again in ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, or ask an administrator for a new password link.`,
      seconds,
    );
  }

  private sweep(): void {
    for (const key of [...this.failures.keys()]) this.current(key);
  }

  private windowMs(): number {
    return this.runtime.config.signInWindowMinutes * MINUTE_MS;
  }

  private nowMs(): number {
    return this.clock.now().getTime();
  }
}

function accountKey(account: string): string {
  return `account ${account.trim().toLowerCase()}`;
}

function pairKey(account: string, address: string): string {
  return `${accountKey(account)} from ${address}`;
}
