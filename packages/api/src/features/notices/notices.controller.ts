import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { type Notice, noticeSchema, pageOf } from '@rivetside/shared';
import { z } from 'zod';
import { Access } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { NoticesService } from './notices.service.js';

const listSchema = z.strictObject({ kitId: z.uuid().optional() });

@ApiTags('notices')
@Controller('notices')
export class NoticesController {
  constructor(private readonly notices: NoticesService) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(noticeSchema) })
  list(@Query({ schema: listSchema }) { kitId }: z.infer<typeof listSchema>): {
    items: Notice[];
    nextCursor: null;
  } {
    return { items: this.notices.list(kitId), nextCursor: null };
  }

  @Get(':id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: noticeSchema })
  read(@Param('id', UuidPipe) id: string): Notice {
    return this.notices.requireById(id);
  }
}
