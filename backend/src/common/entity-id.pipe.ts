import { Injectable, type PipeTransform } from '@nestjs/common';
import { isUUID } from 'class-validator';
import { NotFoundError } from './errors';

/** `@Param('id', EntityIdPipe)`: what is no UUID names nothing, so the answer is 404 and no query runs. */
@Injectable()
export class EntityIdPipe implements PipeTransform<string, string> {
  transform(value: string): string {
    if (!isUUID(value)) throw new NotFoundError();
    return value.toLowerCase();
  }
}
