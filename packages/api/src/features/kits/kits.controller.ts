import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type HoleLine,
  holeLineSchema,
  type Kit,
  kitSchema,
  pageOf,
  type Part,
  partSchema,
  type Section,
  sectionSchema,
  type SectionSummary,
  sectionSummarySchema,
} from '@rivetside/shared';
import { z } from 'zod';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { KitsService } from './kits.service.js';

const findPartsSchema = z.strictObject({ kitId: z.uuid(), q: z.string().trim().min(1).max(60) });
const whole = <T>(items: T[]) => ({ items, nextCursor: null });

@ApiTags('kits')
@Controller()
export class KitsController {
  constructor(private readonly kits: KitsService) {}

  @Get('kits')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(kitSchema) })
  list(): { items: Kit[]; nextCursor: null } {
    return whole(this.kits.list());
  }

  @Get('kits/:kitId')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: kitSchema })
  read(@Param('kitId', UuidPipe) kitId: string): Kit {
    return this.kits.requireById(kitId);
  }

  @Get('kits/:kitId/sections')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(sectionSummarySchema) })
  sections(
    @Actor() actor: ActorType,
    @Param('kitId', UuidPipe) kitId: string,
  ): { items: SectionSummary[]; nextCursor: null } {
    return whole(this.kits.sections(actor, kitId));
  }

  @Get('sections/:id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: sectionSchema })
  section(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Section {
    return this.kits.section(actor, id);
  }

  @Get('hole-lines/:id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: holeLineSchema })
  holeLine(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): HoleLine {
    return this.kits.holeLine(actor, id);
  }

  @Get('parts')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(partSchema) })
  findParts(
    @Actor() actor: ActorType,
    @Query({ schema: findPartsSchema }) { kitId, q }: z.infer<typeof findPartsSchema>,
  ): { items: Part[]; nextCursor: null } {
    return whole(this.kits.findParts(actor, kitId, q));
  }
}
