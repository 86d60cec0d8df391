import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { AnalysesController } from './analyses.controller.js';
import { AnalysesService } from './analyses.service.js';

@Module({
  imports: [RevisionsModule],
  controllers: [AnalysesController],
  providers: [AnalysesService],
  exports: [AnalysesService],
})
export class AnalysesModule {}
