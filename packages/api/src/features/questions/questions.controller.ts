import { Body, Controller, Get, HttpCode, Param, Post, Put, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  type Actor as ActorType,
  type AskQuestion,
  askQuestionSchema,
  type EventsQuery,
  eventsAnswerSchema,
  eventsQuerySchema,
  type Page,
  pageOf,
  type Question,
  type QuestionQuery,
  questionQuerySchema,
  type QuestionRow,
  questionRowSchema,
  questionSchema,
  type ReasonBody,
  reasonBodySchema,
  type Seen,
  seenSchema,
  type SheetEvent,
  type SheetEvents,
  sheetEventSchema,
  type WriteMessage,
  writeMessageSchema,
} from '@rivetside/shared';
import { Access, Actor } from '../../common/access/access.decorator.js';
import { UuidPipe } from '../../common/http/uuid.pipe.js';
import { AskService } from './ask.service.js';
import { QuestionListService } from './question-list.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { QuestionsService } from './questions.service.js';

@ApiTags('questions')
@Controller('questions')
export class QuestionsController {
  constructor(
    private readonly asking: AskService,
    private readonly questions: QuestionsService,
    private readonly lists: QuestionListService,
    private readonly sheets: QuestionSheetService,
  ) {}

  @Get()
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: pageOf(questionRowSchema) })
  list(
    @Actor() actor: ActorType,
    @Query({ schema: questionQuerySchema }) query: QuestionQuery,
  ): Page<QuestionRow> {
    return this.lists.list(actor, query);
  }

  @Post()
  @Access('builder')
  @ApiCreatedResponse({ standardSchema: questionSchema })
  ask(@Actor() actor: ActorType, @Body({ schema: askQuestionSchema }) input: AskQuestion): Promise<Question> {
    return this.asking.ask(actor, input);
  }

  @Get(':id')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: questionSchema })
  read(@Actor() actor: ActorType, @Param('id', UuidPipe) id: string): Question {
    return this.sheets.read(actor, id);
  }

  @Get(':id/events')
  @Access('authenticated')
  @ApiOkResponse({ standardSchema: eventsAnswerSchema })
  events(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Query({ schema: eventsQuerySchema }) query: EventsQuery,
  ): SheetEvents {
    return this.sheets.events(actor, id, query);
  }

  @Post(':id/messages')
  @Access('builder', 'mentor', 'chapterAdmin')
  @ApiCreatedResponse({ standardSchema: sheetEventSchema })
  write(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: writeMessageSchema }) input: WriteMessage,
  ): Promise<SheetEvent> {
    return this.questions.write(actor, id, input);
  }

  @Put(':id/seen')
  @Access('authenticated')
  @HttpCode(204)
  @ApiNoContentResponse()
  see(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: seenSchema }) { seq }: Seen,
  ): Promise<void> {
    return this.questions.see(actor, id, seq);
  }

  @Post(':id/withdrawal')
  @Access('builder')
  @HttpCode(200)
  @ApiOkResponse({ standardSchema: questionSchema })
  withdraw(
    @Actor() actor: ActorType,
    @Param('id', UuidPipe) id: string,
    @Body({ schema: reasonBodySchema }) input: ReasonBody,
  ): Promise<Question> {
    return this.questions.withdraw(actor, id, input);
  }
}
