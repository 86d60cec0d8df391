import { Module } from '@nestjs/common';
import { AnalysesModule } from '../analyses/analyses.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ComparisonsController } from './comparisons.controller.js';

@Module({ imports: [RevisionsModule, AnalysesModule], controllers: [ComparisonsController] })
export class ComparisonsModule {}
