import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Fix,
  fixSchema,
  type ProposeFix,
  proposeFixSchema,
  type ReasonBody,
  reasonBodySchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { FixesService } from './fixes.service.js';

@ApiTags('fixes')
@Controller()
export class FixesController {
  constructor(private readonly fixes: FixesService) {}

  @Post('questions/:id/fixes')
  @Access('mentor')
  @ApiCreatedResponse({ standardSchema: fixSchema })
  propose(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) questionId: string,
    @Body({ schema: proposeFixSchema }) input: ProposeFix,
  ): Promise<Fix> {
    return this.fixes.propose(actor, questionId, input);
  }

  @Post('fixes/:id/withdrawal')
  @Access('mentor')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: fixSchema })
  withdraw(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: reasonBodySchema }) input: ReasonBody,
  ): Promise<Fix> {
    return this.fixes.withdraw(actor, id, input);
  }
}
