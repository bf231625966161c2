import crypto, { scryptSync } from 'node:crypto';
import { readEnvironment } from '../config/environment';
import { Runtime } from '../config/runtime';
import { PasswordHasher } from './password-hasher';

const hasherAt = (cost: number) =>
  new PasswordHasher(new Runtime(readEnvironment({ SCRYPT_COST: String(cost) }), '', false, null));

describe('PasswordHasher', () => {
  const hasher = hasherAt(10);

  it('verifies its own hashes and nothing else', async () => {
    const stored = await hasher.hash('correct horse');
    expect(await hasher.verify('correct horse', stored)).toBe(true);
    expect(await hasher.verify('correct horse ', stored)).toBe(false);
    expect(await hasher.verify('', stored)).toBe(false);
  });

  it('takes the same password differently typed (composed or not) for the same', async () => {
    const stored = await hasher.hash('caf\u00e9 au lait');
    expect(await hasher.verify('cafe\u0301 au lait', stored)).toBe(true);
  });

  it('salts: the same password never has the same hash', async () => {
    expect(await hasher.hash('same')).not.toBe(await hasher.hash('same'));
  });

  it('keeps the parameters in the hash, so that a changed cost leaves old passwords good', async () => {
    const stored = await hasher.hash('old password');
    expect(stored).toMatch(/^scrypt\$10\$8\$1\$/);
    expect(await hasherAt(11).verify('old password', stored)).toBe(true);
  });

  it('is scrypt as Node.js has it', async () => {
    const [, cost, blockSize, parallelization, salt = '', key] = (await hasher.hash('known')).split('$');
    const expected = scryptSync('known', Buffer.from(salt, 'base64'), 32, {
      N: 2 ** Number(cost),
      r: Number(blockSize),
      p: Number(parallelization),
    });
    expect(key).toBe(expected.toString('base64'));
  });

  it('says no without a stored hash, whatever the password', async () => {
    expect(await hasher.verify('anything', null)).toBe(false);
  });

  it('works as long for an account that is not there as for one that is', async () => {
    const stored = await hasher.hash('x');
    await hasher.verify('warm up', null);
    const scrypt = jest.spyOn(crypto, 'scrypt');
    await hasher.verify('guess', stored);
    const known = scrypt.mock.calls.map(([, , keyLength, options]) => [keyLength, options]);
    scrypt.mockClear();
    await hasher.verify('guess', null);
    const unknown = scrypt.mock.calls.map(([, , keyLength, options]) => [keyLength, options]);
    scrypt.mockRestore();
    expect(known).toHaveLength(1);
    expect(unknown).toEqual(known);
  });

  it('hashes at most two at once, however many ask', async () => {
    const original = crypto.scrypt;
    let running = 0;
    let most = 0;
    const scrypt = jest.spyOn(crypto, 'scrypt').mockImplementation((password, salt, length, options, callback) => {
      running += 1;
      most = Math.max(most, running);
      original(password, salt, length, options, (error, key) => {
        running -= 1;
        callback(error, key);
      });
    });
    await Promise.all(Array.from({ length: 8 }, (_, n) => hasher.hash(`password ${n}`)));
    scrypt.mockRestore();
    expect(most).toBe(2);
  });

  it('reports a damaged hash instead of letting anybody in', async () => {
    await expect(hasher.verify('x', 'md5$abc')).rejects.toThrow('damaged');
  });
});
