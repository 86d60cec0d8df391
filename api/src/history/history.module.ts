import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { HistoryController } from './history.controller.js';
import { HistoryService } from './history.service.js';

@Module({ imports: [RevisionsModule], controllers: [HistoryController], providers: [HistoryService] })
export class HistoryModule {}
