import { type ExecutionContext, Injectable } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import type { Request } from 'express';
import { AppValidationPipe } from '../common/validation.pipe';
import { SignInDto } from './dto/sign-in.dto';

const pipe = new AppValidationPipe();

/** Checks mail address and password by passport-local; leaves the account, not yet a session, in `request.user`. */
@Injectable()
export class LocalAuthGuard extends AuthGuard('local') {
  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<Request>();
    // Guards run before pipes, and passport would answer 401 where a field is merely missing.
    await pipe.transform(request.body, { type: 'body', metatype: SignInDto });
    return (await super.canActivate(context)) === true;
  }

  override getAuthenticateOptions(): { session: false } {
    return { session: false };
  }
}
