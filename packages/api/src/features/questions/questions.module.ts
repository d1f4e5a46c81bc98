import { Module } from '@nestjs/common';
import { BuildsModule } from '../builds/builds.module.js';
import { PhotosModule } from '../photos/photos.module.js';
import { SearchModule } from '../search/search.module.js';
import { AskService } from './ask.service.js';
import { CompletionService } from './completion.service.js';
import { DeskController } from './desk.controller.js';
import { DeskService } from './desk.service.js';
import { QuestionDoorService } from './question-door.service.js';
import { QuestionListService } from './question-list.service.js';
import { QuestionLogService } from './question-log.service.js';
import { QuestionOutcomeController } from './question-outcome.controller.js';
import { QuestionPlaceService } from './question-place.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { QuestionsController } from './questions.controller.js';
import { QuestionsGateway } from './questions.gateway.js';
import { QuestionsRealtime } from './questions.realtime.js';
import { QuestionsService } from './questions.service.js';
import { ReferralService } from './referral.service.js';
import { SheetPresence } from './sheet-presence.js';
import { SimilarController } from './similar.controller.js';
import { SimilarService } from './similar.service.js';

@Module({
  imports: [BuildsModule, PhotosModule, SearchModule],
  controllers: [SimilarController, QuestionsController, QuestionOutcomeController, DeskController],
  providers: [
    AskService,
    CompletionService,
    DeskService,
    QuestionDoorService,
    QuestionListService,
    QuestionLogService,
    QuestionPlaceService,
    QuestionSheetService,
    QuestionsGateway,
    QuestionsRealtime,
    QuestionsService,
    ReferralService,
    SheetPresence,
    SimilarService,
  ],
  exports: [QuestionDoorService, QuestionLogService, QuestionSheetService],
})
export class QuestionsModule {}
