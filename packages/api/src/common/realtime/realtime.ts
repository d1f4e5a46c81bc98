import { Injectable } from '@nestjs/common';
import type {
  ClientToServer,
  QuestionChanged,
  ServerToClient,
  SheetEvent,
  SheetPresence,
} from '@rivetside/shared';
import type { Actor } from '@rivetside/shared';
import type { Namespace, Socket } from 'socket.io';

export interface LiveData {
  actor: Actor;
  /** Sheets whose door this socket came through. */
  sheets: Set<string>;
}
export type LiveServer = Namespace<ClientToServer, ServerToClient, Record<string, never>, LiveData>;
export type LiveSocket = Socket<ClientToServer, ServerToClient, Record<string, never>, LiveData>;

export const sheetRoom = (questionId: string) => `sheet:${questionId}`;
export const chapterRoom = (chapterId: string) => `chapter:${chapterId}`;
export const kitRoom = (kitId: string) => `kit:${kitId}`;
export const sessionRoom = (sessionId: string) => `session:${sessionId}`;
export const userRoom = (userId: string) => `user:${userId}`;

/** What features say to those who watch; silent until the gateway has opened. */
@Injectable()
export class Realtime {
  private server: LiveServer | null = null;

  opened(server: LiveServer): void {
    this.server = server;
  }

  toSheet(event: SheetEvent): void {
    this.server?.to(sheetRoom(event.questionId)).emit('sheet:event', event);
  }

  presence(presence: SheetPresence): void {
    this.server?.to(sheetRoom(presence.questionId)).emit('sheet:presence', presence);
  }

  questionChanged(rooms: string[], change: QuestionChanged): void {
    this.server?.to(rooms).emit('question.changed', change);
  }

  /** Tells the session why and closes its sockets. */
  endSession(sessionId: string, reason: string): void {
    const room = this.server?.in(sessionRoom(sessionId));
    room?.emit('session:ended', { reason });
    room?.disconnectSockets(true);
  }

  /** A changed role is asked for again at the door: everyone concerned comes in anew. */
  reconnectUser(userId: string): void {
    this.server?.in(userRoom(userId)).disconnectSockets(true);
  }
}
