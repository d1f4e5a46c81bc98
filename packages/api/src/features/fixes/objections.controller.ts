import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type AnswerObjection,
  answerObjectionSchema,
  type Objection,
  objectionSchema,
  objectSchema,
  type ReasonBody,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { ObjectionsService } from './objections.service.js';

@ApiTags('fixes')
@Controller()
export class ObjectionsController {
  constructor(private readonly objections: ObjectionsService) {}

  @Post('fixes/:id/objections')
  @Access('mentor')
  @ApiCreatedResponse({ standardSchema: objectionSchema })
  object(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) fixId: string,
    @Body({ schema: objectSchema }) input: ReasonBody,
  ): Promise<Objection> {
    return this.objections.object(actor, fixId, input);
  }

  @Post('objections/:id/answer')
  @Access('mentor')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: objectionSchema })
  answer(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: answerObjectionSchema }) input: AnswerObjection,
  ): Promise<Objection> {
    return this.objections.answer(actor, id, input);
  }
}
