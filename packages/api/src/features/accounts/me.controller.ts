import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiAcceptedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type ChangeEmail,
  changeEmailSchema,
  type ChangeMe,
  changeMeSchema,
  type ChangePassword,
  changePasswordSchema,
  type MailSent,
  mailSentSchema,
  type Me,
  meSchema,
  type Page,
  type PageAsked,
  pageOf,
  pageQuerySchema,
  type Session,
  sessionSchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { CredentialsService } from './credentials.service.js';
import { MeService } from './me.service.js';
import { SessionsService } from './sessions.service.js';

@ApiTags('me')
@Controller('me')
export class MeController {
  constructor(
    private readonly me: MeService,
    private readonly credentials: CredentialsService,
    private readonly sessions: SessionsService,
  ) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: meSchema })
  read(@Actor() actor: ActorType): Promise<Me> {
    return this.me.read(actor.id);
  }

  @Patch()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: meSchema })
  change(@Actor() actor: ActorType, @Body({ schema: changeMeSchema }) input: ChangeMe): Promise<Me> {
    return this.me.change(actor, input);
  }

  @Post('password')
  @HttpCode(204)
  @Access('authenticated')
  changePassword(
    @Actor() actor: ActorType,
    @Body({ schema: changePasswordSchema }) input: ChangePassword,
  ): Promise<void> {
    return this.credentials.changePassword(actor, input);
  }

  @Post('email')
  @HttpCode(202)
  @Access('authenticated')
  @ApiAcceptedResponse({ standardSchema: mailSentSchema })
  changeEmail(
    @Actor() actor: ActorType,
    @Body({ schema: changeEmailSchema }) input: ChangeEmail,
  ): Promise<MailSent> {
    return this.credentials.changeEmail(actor, input);
  }

  @Get('sessions')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(sessionSchema) })
  listSessions(
    @Actor() actor: ActorType,
    @Query({ schema: pageQuerySchema }) page: PageAsked,
  ): Page<Session> {
    return this.sessions.list(actor, page);
  }

  @Delete('sessions')
  @HttpCode(204)
  @Access('authenticated')
  endOtherSessions(@Actor() actor: ActorType): Promise<void> {
    return this.sessions.endOthers(actor);
  }

  @Delete('sessions/:id')
  @HttpCode(204)
  @Access('authenticated')
  endSession(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Promise<void> {
    return this.sessions.end(actor, id);
  }
}
