import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Endorse,
  type Endorsement,
  endorsementSchema,
  endorseSchema,
  type ReasonBody,
  reasonBodySchema,
  type ReviewStamp,
  reviewStampSchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { EndorsementsService } from './endorsements.service.js';
import { StampReviewService } from './stamp-review.service.js';

@ApiTags('endorsements')
@Controller()
export class EndorsementsController {
  constructor(
    private readonly endorsements: EndorsementsService,
    private readonly reviews: StampReviewService,
  ) {}

  @Post('fixes/:id/endorsements')
  @Access('mentor')
  @ApiCreatedResponse({ standardSchema: endorsementSchema })
  endorse(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) fixId: string,
    @Body({ schema: endorseSchema }) input: Endorse,
  ): Promise<Endorsement> {
    return this.endorsements.endorse(actor, fixId, input);
  }

  @Post('endorsements/:id/withdrawal')
  @Access('mentor', 'steward')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: endorsementSchema })
  withdraw(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: reasonBodySchema }) input: ReasonBody,
  ): Promise<Endorsement> {
    return this.reviews.withdraw(actor, id, input);
  }

  @Post('endorsements/:id/review')
  @Access('mentor')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: endorsementSchema })
  review(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: reviewStampSchema }) input: ReviewStamp,
  ): Promise<Endorsement> {
    return this.reviews.review(actor, id, input);
  }
}
