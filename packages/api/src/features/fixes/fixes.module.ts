import { Module } from '@nestjs/common';
import { QuestionsModule } from '../questions/questions.module.js';
import { SearchModule } from '../search/search.module.js';
import { FixesController } from './fixes.controller.js';
import { FixesService } from './fixes.service.js';
import { ObjectionsController } from './objections.controller.js';
import { ObjectionsService } from './objections.service.js';

@Module({
  imports: [QuestionsModule, SearchModule],
  controllers: [FixesController, ObjectionsController],
  providers: [FixesService, ObjectionsService],
  exports: [FixesService],
})
export class FixesModule {}
