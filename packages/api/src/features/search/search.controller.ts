import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type Page,
  pageOf,
  type SearchHit,
  searchHitSchema,
  searchQuerySchema,
  type SearchRequest,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { SearchService } from './search.service.js';

@ApiTags('search')
@Controller('search')
export class SearchController {
  constructor(private readonly searching: SearchService) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(searchHitSchema) })
  search(
    @Actor() actor: ActorType,
    @Query({ schema: searchQuerySchema }) query: SearchRequest,
  ): Page<SearchHit> {
    return this.searching.search(actor, query);
  }
}
