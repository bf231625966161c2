import { Injectable } from '@nestjs/common';

/** The one source of the present instant, so that tests can set it. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }
}
