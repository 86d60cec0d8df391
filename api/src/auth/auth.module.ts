import { Global, Module, type DynamicModule } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { DatabaseService } from '../database/database.service.js';
import { makeAccounts } from './accounts.js';
import { AuthController } from './auth.controller.js';
import { LinksService } from './links.service.js';
import { PeopleService } from './people.service.js';
import { SessionGuard } from './session.guard.js';
import { ACCOUNTS } from './tokens.js';

@Global()
@Module({})
export class AuthModule {
  static with(options: { readonly secret: string; readonly origin: string }): DynamicModule {
    return {
      module: AuthModule,
      controllers: [AuthController],
      providers: [
        {
          provide: ACCOUNTS,
          useFactory: (database: DatabaseService) => makeAccounts({ pool: database.pool, ...options }),
          inject: [DatabaseService],
        },
        LinksService,
        PeopleService,
        { provide: APP_GUARD, useClass: SessionGuard },
      ],
      exports: [ACCOUNTS, LinksService, PeopleService],
    };
  }
}
