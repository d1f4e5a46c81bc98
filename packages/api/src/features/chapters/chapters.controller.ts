import { Controller, Get, Param } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Chapter,
  type ChapterMember,
  chapterMemberSchema,
  chapterSchema,
  pageOf,
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
  list(@Actor() actor: ActorType): { items: Chapter[]; nextCursor: null } {
    return { items: this.chapters.list(actor), nextCursor: null };
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
  ): { items: ChapterMember[]; nextCursor: null } {
    return { items: this.chapters.members(actor, id), nextCursor: null };
  }
}
