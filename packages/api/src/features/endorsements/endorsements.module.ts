import { Module } from '@nestjs/common';
import { BuildsModule } from '../builds/builds.module.js';
import { FixesModule } from '../fixes/fixes.module.js';
import { QuestionsModule } from '../questions/questions.module.js';
import { EndorsementsController } from './endorsements.controller.js';
import { EndorsementsService } from './endorsements.service.js';
import { StampExpiryJob } from './stamp-expiry.job.js';
import { StampFollowUp } from './stamp-follow-up.js';
import { StampReviewService } from './stamp-review.service.js';

@Module({
  imports: [BuildsModule, FixesModule, QuestionsModule],
  controllers: [EndorsementsController],
  providers: [EndorsementsService, StampExpiryJob, StampFollowUp, StampReviewService],
})
export class EndorsementsModule {}
