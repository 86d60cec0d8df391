import { Module } from '@nestjs/common';
import { AnalysesModule } from '../analyses/analyses.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { HistoryController } from './history.controller.js';
import { HistoryService } from './history.service.js';

@Module({ imports: [RevisionsModule, AnalysesModule], controllers: [HistoryController], providers: [HistoryService] })
export class HistoryModule {}
