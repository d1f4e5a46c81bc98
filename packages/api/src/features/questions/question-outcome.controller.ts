import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Complete,
  completeSchema,
  type Question,
  questionSchema,
  type Refer,
  type ReferralAnswer,
  referralAnswerSchema,
  referSchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { CompletionService } from './completion.service.js';
import { ReferralService } from './referral.service.js';

/** How a question leaves the bench: carried out, or sent to the kit maker and back. */
@ApiTags('questions')
@Controller('questions/:id')
export class QuestionOutcomeController {
  constructor(
    private readonly completions: CompletionService,
    private readonly referrals: ReferralService,
  ) {}

  @Post('completion')
  @Access('builder', 'mentor', 'chapterAdmin')
  @ApiCreatedResponse({ standardSchema: questionSchema })
  carryOut(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: completeSchema }) input: Complete,
  ): Promise<Question> {
    return this.completions.carryOut(actor, id, input);
  }

  @Post('referral')
  @Access('builder', 'mentor')
  @ApiCreatedResponse({ standardSchema: questionSchema })
  refer(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: referSchema }) input: Refer,
  ): Promise<Question> {
    return this.referrals.refer(actor, id, input);
  }

  @Post('referral/answer')
  @Access('builder', 'mentor')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: questionSchema })
  answer(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: referralAnswerSchema }) input: ReferralAnswer,
  ): Promise<Question> {
    return this.referrals.answer(actor, id, input);
  }
}
