import type { PipeTransform } from '@nestjs/common';
import { validate } from 'class-validator';
import { InvalidError } from '../errors';
import { toFieldErrors } from '../field-errors';
import { instanceOf } from './nested';
import type { Union } from './union';

/** A body that is one of several shapes; the global pipe can only check a body of one class. */
export class UnionPipe implements PipeTransform {
  constructor(private readonly union: Union) {}

  async transform(value: unknown): Promise<unknown> {
    const instance = instanceOf(this.union, value);
    if (typeof instance !== 'object' || instance === null) {
      throw new InvalidError([{ path: '', code: 'not_an_object', message: 'The body must be one JSON object.' }]);
    }
    const errors = await validate(instance, { whitelist: true, forbidNonWhitelisted: true, forbidUnknownValues: true });
    if (errors.length > 0) throw new InvalidError(toFieldErrors(errors));
    return instance;
  }
}
