import { z } from 'zod';
import type { SheetEvent } from '../questions/sheet-event.schema.js';

/** What a client may say over the socket; all of it is checked like a request. */
export const joinSheetSchema = z.strictObject({ questionId: z.uuid(), afterSeq: z.number().int().min(0) });
export type JoinSheet = z.infer<typeof joinSheetSchema>;
export const leaveSheetSchema = z.strictObject({ questionId: z.uuid() });
export const writingSchema = z.strictObject({ questionId: z.uuid(), writing: z.boolean() });

/** Writing that is not said again within this time has stopped. */
export const WRITING_LASTS_MS = 6_000;

export interface SheetPresence {
  questionId: string;
  people: { userId: string; name: string; writing: boolean }[];
}

/** `whole` false: more was missed than fits; read the sheet again. */
export type JoinAnswer =
  | { ok: true; events: SheetEvent[]; whole: boolean }
  | { ok: false; status: number; title: string; detail: string };

export interface QuestionChanged {
  questionId: string;
  sectionId: string | null;
  chapterId: string;
}

export interface ServerToClient {
  'sheet:event': (event: SheetEvent) => void;
  'sheet:presence': (presence: SheetPresence) => void;
  'question.changed': (change: QuestionChanged) => void;
  'session:ended': (why: { reason: string }) => void;
}

export interface ClientToServer {
  'sheet:join': (join: JoinSheet, answer: (answer: JoinAnswer) => void) => void;
  'sheet:leave': (leave: { questionId: string }) => void;
  'sheet:writing': (writing: { questionId: string; writing: boolean }) => void;
}
