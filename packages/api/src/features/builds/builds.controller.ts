import { Body, Controller, Get, Param, Post, Put, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Build,
  buildSchema,
  type ClearOpenItem,
  clearOpenItemSchema,
  type Entry,
  entrySchema,
  type OpenItem,
  openItemSchema,
  type Page,
  pageOf,
  pageQuerySchema,
  type StepStates,
  stepStatesSchema,
} from '@rivetside/shared';
import type { z } from 'zod';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { BuildsService } from './builds.service.js';

const whole = <T>(items: T[]) => ({ items, nextCursor: null });

@ApiTags('builds')
@Controller()
export class BuildsController {
  constructor(private readonly builds: BuildsService) {}

  @Get('builds')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(buildSchema) })
  own(@Actor() actor: ActorType): { items: Build[]; nextCursor: null } {
    return whole(this.builds.own(actor));
  }

  @Get('builds/:id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: buildSchema })
  read(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Build {
    return this.builds.requireById(actor, id);
  }

  @Get('builds/:id/entries')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(entrySchema) })
  entries(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Query({ schema: pageQuerySchema }) page: z.infer<typeof pageQuerySchema>,
  ): Page<Entry> {
    return this.builds.entries(actor, id, page);
  }

  @Get('builds/:id/open-items')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(openItemSchema) })
  openItems(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
  ): { items: OpenItem[]; nextCursor: null } {
    return whole(this.builds.openItems(actor, id));
  }

  @Post('open-items/:id/clearance')
  @Access('authenticated')
  @ApiCreatedResponse({ standardSchema: openItemSchema })
  clear(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: clearOpenItemSchema }) input: ClearOpenItem,
  ): Promise<OpenItem> {
    return this.builds.clear(actor, id, input);
  }

  @Get('builds/:id/sections/:sectionId/progress')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: stepStatesSchema })
  progress(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Param('sectionId', UuidPipe) sectionId: string,
  ): StepStates {
    return this.builds.progress(actor, id, sectionId);
  }

  @Put('builds/:id/sections/:sectionId/progress')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: stepStatesSchema })
  setProgress(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Param('sectionId', UuidPipe) sectionId: string,
    @Body({ schema: stepStatesSchema }) input: StepStates,
  ): Promise<StepStates> {
    return this.builds.setProgress(actor, id, sectionId, input);
  }
}
