import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Chapter,
  type ChapterMember,
  chapterMemberSchema,
  chapterSchema,
  type Page,
  type PageAsked,
  pageOf,
  pageQuerySchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { ChaptersService } from './chapters.service.js';

@ApiTags('chapters')
@Controller('chapters')
export class ChaptersController {
  constructor(private readonly chapters: ChaptersService) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(chapterSchema) })
  list(@Actor() actor: ActorType, @Query({ schema: pageQuerySchema }) page: PageAsked): Page<Chapter> {
    return this.chapters.list(actor, page);
  }

  @Get(':id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: chapterSchema })
  read(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Chapter {
    return this.chapters.requireById(actor, id);
  }

  @Get(':id/members')
  @Access('builder', 'mentor', 'chapterAdmin', 'siteAdmin')
  @ApiOkResponse({ standardSchema: pageOf(chapterMemberSchema) })
  members(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Query({ schema: pageQuerySchema }) page: PageAsked,
  ): Page<ChapterMember> {
    return this.chapters.members(actor, id, page);
  }
}
