import { randomUUID } from 'node:crypto';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { getModelToken } from '@nestjs/sequelize';
import type { Role } from '../../src/common/role';
import { WriteQueue } from '../../src/database/write-queue';
import { User } from '../../src/users/models/user.model';
import { PasswordHasher } from '../../src/users/password-hasher';

export interface CreateUserOptions {
  readonly roles?: readonly Role[];
  readonly name?: string;
  readonly email?: string;
  readonly password?: string;
  readonly active?: boolean;
}

export interface TestUser {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

let counter = 0;

/** A person straight in the database, with a password; every default is unique. */
export async function createUser(app: NestExpressApplication, options: CreateUserOptions = {}): Promise<TestUser> {
  counter += 1;
  const {
    roles = ['designer'],
    name = `Person ${counter}`,
    email = `person${counter}@example.org`,
    password = 'correct horse battery',
    active = true,
  } = options;
  const passwordHash = await app.get(PasswordHasher, { strict: false }).hash(password);
  const users = app.get<typeof User>(getModelToken(User), { strict: false });
  const id = randomUUID();
  await app.get(WriteQueue).transaction(async (transaction) => {
    await users.create({ id, name, email, roles: [...roles], active, passwordHash }, { transaction });
  });
  return { id, name, email, password };
}
