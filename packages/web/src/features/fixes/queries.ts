import {
  type AnswerObjection,
  type Complete,
  fixSchema,
  objectionSchema,
  type ProposeFix,
  questionSchema,
  type ReasonBody,
} from '@rivetside/shared';
import { api } from '../../lib/api';

/** What changes a sheet is told by its live events too; the answer only says that it was taken. */
export const fixWire = {
  propose: (questionId: string, body: ProposeFix, key: string) =>
    api.post(`/questions/${questionId}/fixes`, { body, key, answer: fixSchema }),
  withdraw: (fixId: string, body: ReasonBody, key: string) =>
    api.post(`/fixes/${fixId}/withdrawal`, { body, key, answer: fixSchema }),
  object: (fixId: string, body: ReasonBody, key: string) =>
    api.post(`/fixes/${fixId}/objections`, { body, key, answer: objectionSchema }),
  answer: (objectionId: string, body: AnswerObjection, key: string) =>
    api.post(`/objections/${objectionId}/answer`, { body, key, answer: objectionSchema }),
  carryOut: (questionId: string, body: Complete, key: string) =>
    api.post(`/questions/${questionId}/completion`, { body, key, answer: questionSchema }),
};
