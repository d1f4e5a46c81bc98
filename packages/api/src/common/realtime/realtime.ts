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
  /** Until when they count as writing, by question; milliseconds since 1970. */
  writing: Record<string, number>;
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

  /** Says to a sheet who has it open, in whichever process; somebody with several tabs is there once. */
  async tellPresence(questionId: string): Promise<void> {
    if (!this.server) return;
    const room = this.server.in(sheetRoom(questionId));
    const people = peopleAt(questionId, await room.fetchSockets());
    if (people.length > 0) room.emit('sheet:presence', { questionId, people });
  }

  questionChanged(rooms: string[], change: QuestionChanged): void {
    this.server?.to(rooms).emit('question.changed', change);
  }

  /** Tells the session why and closes its sockets, in every process. */
  endSession(sessionId: string, reason: string): void {
    const room = this.server?.in(sessionRoom(sessionId));
    room?.emit('session:ended', { reason });
    room?.disconnectSockets(true);
  }

  /** The sockets of this process. */
  socketsHere(): LiveSocket[] {
    return [...(this.server?.sockets.values() ?? [])];
  }

  /** Puts out whose session has ended. Whose rights have changed comes in anew: every door asks again. */
  standingOf(socket: LiveSocket, actor: Actor | null): void {
    if (!actor) {
      socket.emit('session:ended', { reason: 'This session has ended.' });
      socket.disconnect(true);
    } else if (rightsOf(actor) !== rightsOf(socket.data.actor)) {
      // As if the line had broken: the client connects again by itself and catches up.
      socket.conn.close();
    }
  }
}

/** Somebody with several tabs is there once, and writes if they do in any of them. */
function peopleAt(questionId: string, sockets: readonly { data: LiveData }[]): SheetPresence['people'] {
  const people = new Map<string, SheetPresence['people'][number]>();
  const now = Date.now();
  for (const { data } of sockets) {
    const { id: userId, name } = data.actor;
    const writing = (data.writing[questionId] ?? 0) > now || people.get(userId)?.writing === true;
    people.set(userId, { userId, name, writing });
  }
  return [...people.values()];
}

function rightsOf({ siteRole, memberships }: Actor): string {
  return JSON.stringify([siteRole, memberships]);
}
