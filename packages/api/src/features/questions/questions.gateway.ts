import {
  ConnectedSocket,
  MessageBody,
  type OnGatewayDisconnect,
  SubscribeMessage,
  WebSocketGateway,
} from '@nestjs/websockets';
import {
  canSeeQuestion,
  type JoinAnswer,
  joinSheetSchema,
  leaveSheetSchema,
  WRITING_LASTS_MS,
  writingSchema,
} from '@rivetside/shared';
import { type LiveSocket, sheetRoom } from '../../common/realtime/realtime.js';
import { QuestionDoorService } from './question-door.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { SheetPresence } from './sheet-presence.js';

/** More than that is read again over HTTP: a socket is no place for a whole history. */
const CATCH_UP_MAX = 500;
/** A reader has a few sheets open, never hundreds. */
const SHEETS_MAX = 50;

const refusal = (status: number, title: string, detail: string): JoinAnswer => ({
  ok: false,
  status,
  title,
  detail,
});
const UNREADABLE = refusal(
  400,
  'Something in it cannot be',
  'A question and the last number seen are needed.',
);
const UNKNOWN = refusal(404, 'Not found', 'There is no such question, or it is not yours to see.');
const TOO_MANY = refusal(409, 'Too many sheets', 'Close some sheets first.');

/** The room of a sheet: who may come in, what they missed, who is there. */
@WebSocketGateway({ namespace: '/live' })
export class QuestionsGateway implements OnGatewayDisconnect {
  constructor(
    private readonly door: QuestionDoorService,
    private readonly sheets: QuestionSheetService,
    private readonly presence: SheetPresence,
  ) {}

  @SubscribeMessage('sheet:join')
  async join(@ConnectedSocket() socket: LiveSocket, @MessageBody() body: unknown): Promise<JoinAnswer> {
    const asked = joinSheetSchema.safeParse(body);
    if (!asked.success) return UNREADABLE;
    const { questionId, afterSeq } = asked.data;
    const question = this.door.find(questionId);
    if (!question || !canSeeQuestion(socket.data.actor, question)) return UNKNOWN;
    if (socket.data.sheets.size >= SHEETS_MAX && !socket.data.sheets.has(questionId)) return TOO_MANY;
    // In the room first, then what was missed: what comes in between is heard twice rather than never.
    await socket.join(sheetRoom(questionId));
    socket.data.sheets.add(questionId);
    this.presence.changed(questionId);
    const missed = this.sheets.after(questionId, afterSeq, CATCH_UP_MAX + 1);
    return { ok: true, events: missed.slice(0, CATCH_UP_MAX), whole: missed.length <= CATCH_UP_MAX };
  }

  @SubscribeMessage('sheet:leave')
  async leave(@ConnectedSocket() socket: LiveSocket, @MessageBody() body: unknown): Promise<void> {
    const left = leaveSheetSchema.safeParse(body);
    if (!left.success) return;
    const { questionId } = left.data;
    await socket.leave(sheetRoom(questionId));
    socket.data.sheets.delete(questionId);
    delete socket.data.writing[questionId];
    this.presence.changed(questionId);
  }

  @SubscribeMessage('sheet:writing')
  writing(@ConnectedSocket() socket: LiveSocket, @MessageBody() body: unknown): void {
    const said = writingSchema.safeParse(body);
    if (!said.success || !socket.data.sheets.has(said.data.questionId)) return;
    const { questionId, writing } = said.data;
    if (writing) {
      socket.data.writing[questionId] = Date.now() + WRITING_LASTS_MS;
      this.presence.changedLater(questionId, WRITING_LASTS_MS);
    } else {
      delete socket.data.writing[questionId];
    }
    this.presence.changed(questionId);
  }

  handleDisconnect(socket: LiveSocket): void {
    for (const questionId of socket.data.sheets ?? []) this.presence.changed(questionId);
  }
}
