import { type DynamicModule, Module } from '@nestjs/common';
import { APP_FILTER, APP_GUARD, APP_PIPE } from '@nestjs/core';
import { ThrottlerModule } from '@nestjs/throttler';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { SessionGuard } from './auth/session.guard';
import { CalculatorModule } from './calculator/calculator.module';
import { ChainsModule } from './chains/chains.module';
import { CommonModule } from './common/common.module';
import { CsrfGuard } from './common/csrf.guard';
import { ErrorFilter } from './common/error.filter';
import { RateLimitGuard } from './common/rate-limit.guard';
import { rateLimitOptions } from './common/rate-limit.options';
import { AppValidationPipe } from './common/validation.pipe';
import { Runtime } from './config/runtime';
import { RuntimeModule } from './config/runtime.module';
import { DatabaseModule } from './database/database.module';
import { DevicesModule } from './devices/devices.module';
import { HealthModule } from './health/health.module';
import { ProjectsModule } from './projects/projects.module';
import { QuotesModule } from './quotes/quotes.module';
import { SettingsModule } from './settings/settings.module';
import { UsersModule } from './users/users.module';

@Module({
  imports: [
    CommonModule,
    DatabaseModule,
    AuditModule,
    SettingsModule,
    UsersModule,
    AuthModule,
    HealthModule,
    ProjectsModule,
    DevicesModule,
    QuotesModule,
    CalculatorModule,
    ChainsModule,
    ThrottlerModule.forRootAsync({ inject: [Runtime], useFactory: rateLimitOptions }),
  ],
  providers: [
    // Guards run in this order, then the pipe.
    { provide: APP_GUARD, useClass: RateLimitGuard },
    { provide: APP_GUARD, useClass: CsrfGuard },
    { provide: APP_GUARD, useClass: SessionGuard },
    { provide: APP_PIPE, useClass: AppValidationPipe },
    { provide: APP_FILTER, useClass: ErrorFilter },
  ],
})
export class AppModule {
  static register(runtime: Runtime): DynamicModule {
    return { module: AppModule, imports: [RuntimeModule.register(runtime)] };
  }
}
