import { Module } from '@nestjs/common';
import { ProjectsController } from './projects.controller.js';
import { ProjectsService } from './projects.service.js';

@Module({ controllers: [ProjectsController], providers: [ProjectsService] })
export class ProjectsModule {}
