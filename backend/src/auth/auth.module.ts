import { Module } from '@nestjs/common';
import { PassportModule } from '@nestjs/passport';
import { UsersModule } from '../users/users.module';
import { AuthService } from './auth.service';
import { LocalStrategy } from './local.strategy';
import { OneTimeLinksController } from './one-time-links.controller';
import { SessionController } from './session.controller';
import { SetupController } from './setup.controller';
import { SignInLimiter } from './sign-in-limiter';
import { SignInService } from './sign-in.service';

@Module({
  imports: [PassportModule, UsersModule],
  controllers: [SessionController, SetupController, OneTimeLinksController],
  providers: [AuthService, LocalStrategy, SignInLimiter, SignInService],
})
export class AuthModule {}
