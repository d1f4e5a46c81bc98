import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { type Actor as ActorType, type Desk, deskSchema } from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { DeskService } from './desk.service.js';

@ApiTags('questions')
@Controller('desk')
export class DeskController {
  constructor(private readonly desk: DeskService) {}

  @Get()
  @Access('mentor')
  @ApiOkResponse({ standardSchema: deskSchema })
  read(@Actor() actor: ActorType): Desk {
    return this.desk.of(actor);
  }
}
