import { type ArgumentMetadata, Injectable, ValidationPipe } from '@nestjs/common';
import { InvalidError } from './errors';
import { toFieldErrors } from './field-errors';
import { cleanJson } from './json-walk';

/** Body, query and parameters against their DTO: unknown fields are refused, nothing is converted silently. */
@Injectable()
export class AppValidationPipe extends ValidationPipe {
  constructor() {
    super({
      whitelist: true,
      forbidNonWhitelisted: true,
      forbidUnknownValues: true,
      transform: true,
      stopAtFirstError: false,
      validationError: { target: false, value: true },
      exceptionFactory: (errors) => new InvalidError(toFieldErrors(errors)),
    });
  }

  override async transform(value: unknown, metadata: ArgumentMetadata): Promise<unknown> {
    if (metadata.type !== 'body') return super.transform(value, metadata);
    const cleaned = cleanJson(value);
    if (Array.isArray(cleaned)) {
      throw new InvalidError([{ path: '', code: 'not_an_object', message: 'The body must be one JSON object.' }]);
    }
    return super.transform(cleaned, metadata);
  }
}
