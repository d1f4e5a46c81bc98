import { Body, Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  pageOf,
  type SimilarAsked,
  similarAskedSchema,
  type SimilarQuery,
  similarQuerySchema,
  type SimilarQuestion,
  similarQuestionSchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { SimilarService } from './similar.service.js';

interface SimilarList {
  items: SimilarQuestion[];
  nextCursor: null;
}

/** Met before: by address for a question or a place, by body while a hole card is being filled in. */
@ApiTags('questions')
@Controller('questions/similar')
export class SimilarController {
  constructor(private readonly similar: SimilarService) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(similarQuestionSchema) })
  to(@Actor() actor: ActorType, @Query({ schema: similarAskedSchema }) asked: SimilarAsked): SimilarList {
    return { items: this.similar.toAsked(actor, asked), nextCursor: null };
  }

  @Post()
  @Access('authenticated')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: pageOf(similarQuestionSchema) })
  find(@Actor() actor: ActorType, @Body({ schema: similarQuerySchema }) query: SimilarQuery): SimilarList {
    return { items: this.similar.find(actor, query), nextCursor: null };
  }
}
