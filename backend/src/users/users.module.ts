import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AccountsService } from './accounts.service';
import { OneTimeLink } from './models/one-time-link.model';
import { User } from './models/user.model';
import { OneTimeLinksService } from './one-time-links.service';
import { PasswordHasher } from './password-hasher';
import { UsersController } from './users.controller';
import { UsersService } from './users.service';

@Module({
  imports: [SequelizeModule.forFeature([User, OneTimeLink])],
  controllers: [UsersController],
  providers: [UsersService, AccountsService, OneTimeLinksService, PasswordHasher],
  exports: [UsersService, AccountsService, PasswordHasher],
})
export class UsersModule {}
