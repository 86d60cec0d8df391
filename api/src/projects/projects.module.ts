import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ProjectsController } from './projects.controller.js';
import { ProjectsService } from './projects.service.js';

@Module({ imports: [RevisionsModule], controllers: [ProjectsController], providers: [ProjectsService] })
export class ProjectsModule {}
