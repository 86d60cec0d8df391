import { Module, type DynamicModule } from '@nestjs/common';
import { AccessModule } from './access/access.module.js';
import { AnalysesModule } from './analyses/analyses.module.js';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { ComparisonsModule } from './comparisons/comparisons.module.js';
import { DatabaseModule } from './database/database.module.js';
import { EngineModule } from './engine/engine.module.js';
import { FoundationModule } from './foundation/foundation.module.js';
import { HealthModule } from './health/health.module.js';
import { HistoryModule } from './history/history.module.js';
import { ProjectsModule } from './projects/projects.module.js';
import { RevisionsModule } from './revisions/revisions.module.js';

@Module({})
export class AppModule {
  static with(options: {
    readonly databaseUrl: string;
    readonly secret: string;
    readonly origin: string;
  }): DynamicModule {
    return {
      module: AppModule,
      imports: [
        DatabaseModule.at(options.databaseUrl),
        AuthModule.with(options),
        EngineModule,
        AccessModule,
        HealthModule,
        ProjectsModule,
        RevisionsModule,
        AnalysesModule,
        FoundationModule,
        ComparisonsModule,
        HistoryModule,
        AuditModule,
      ],
    };
  }
}
