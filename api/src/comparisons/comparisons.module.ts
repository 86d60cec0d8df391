import { Module } from '@nestjs/common';
import { AnalysesModule } from '../analyses/analyses.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { CausesService } from './causes.service.js';
import { ComparisonsController } from './comparisons.controller.js';

@Module({
  imports: [RevisionsModule, AnalysesModule],
  controllers: [ComparisonsController],
  providers: [CausesService],
})
export class ComparisonsModule {}
