import { randomBytes, scrypt, type ScryptOptions, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Semaphore } from 'async-mutex';
import { Runtime } from '../config/runtime';

const SALT_BYTES = 16;
const KEY_BYTES = 32;
const BLOCK_SIZE = 8;
/** A hash takes 64 MB at the default cost: more than two at once would let sign-ins exhaust a small machine. */
const HASHES_AT_ONCE = 2;

interface Parameters {
  readonly costLog2: number;
  readonly blockSize: number;
  readonly parallelization: number;
}

function derive(password: string, salt: Buffer, { costLog2, blockSize, parallelization }: Parameters): Promise<Buffer> {
  const N = 2 ** costLog2;
  const options: ScryptOptions = { N, r: blockSize, p: parallelization, maxmem: 256 * N * blockSize };
  return new Promise((resolve, reject) => {
    scrypt(password.normalize('NFC'), salt, KEY_BYTES, options, (error, key) => (error ? reject(error) : resolve(key)));
  });
}

/** scrypt hashes as text with their parameters: `scrypt$16$8$1$salt$key`, so that the cost can rise later. */
@Injectable()
export class PasswordHasher {
  private readonly semaphore = new Semaphore(HASHES_AT_ONCE);
  private dummyHash: Promise<string> | null = null;

  constructor(private readonly runtime: Runtime) {}

  async hash(password: string): Promise<string> {
    const parameters: Parameters = {
      costLog2: this.runtime.config.scryptCost,
      blockSize: BLOCK_SIZE,
      parallelization: 1,
    };
    const salt = randomBytes(SALT_BYTES);
    const key = await this.semaphore.runExclusive(() => derive(password, salt, parameters));
    const { costLog2, blockSize, parallelization } = parameters;
    return ['scrypt', costLog2, blockSize, parallelization, salt.toString('base64'), key.toString('base64')].join('$');
  }

  /** Without a stored hash the same work is done against a dummy, so that the time tells nothing. */
  async verify(password: string, storedHash: string | null): Promise<boolean> {
    this.dummyHash ??= this.hash(randomBytes(KEY_BYTES).toString('base64'));
    const [scheme, costLog2, blockSize, parallelization, salt, key] = (storedHash ?? (await this.dummyHash)).split('$');
    if (scheme !== 'scrypt' || salt === undefined || key === undefined) throw new Error('A password hash is damaged.');
    const expected = Buffer.from(key, 'base64');
    const parameters = {
      costLog2: Number(costLog2),
      blockSize: Number(blockSize),
      parallelization: Number(parallelization),
    };
    const actual = await this.semaphore.runExclusive(() => derive(password, Buffer.from(salt, 'base64'), parameters));
    return timingSafeEqual(actual, expected) && storedHash !== null;
  }
}
