import { Global, Module, type DynamicModule } from '@nestjs/common';
import { DatabaseService } from './database.service.js';

@Global()
@Module({})
export class DatabaseModule {
  static at(url: string): DynamicModule {
    return {
      module: DatabaseModule,
      providers: [{ provide: DatabaseService, useFactory: () => new DatabaseService(url) }],
      exports: [DatabaseService],
    };
  }
}
