import { Module } from '@nestjs/common';
import { AnalysesModule } from '../analyses/analyses.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { FoundationController } from './foundation.controller.js';

@Module({ imports: [RevisionsModule, AnalysesModule], controllers: [FoundationController] })
export class FoundationModule {}
