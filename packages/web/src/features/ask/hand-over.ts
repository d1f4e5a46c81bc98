import type { Question } from '@rivetside/shared';
import { dropDraft, sendWhenOnline } from '../../lib/drafts';

/** The question was taken back before it could be sent: nobody has to be told. */
export class TakenBack extends Error {}

interface InHand {
  readonly promise: Promise<Question>;
  isTakenBack: boolean;
}

/** Questions on their way, by draft: whoever opens the page anew finds theirs and does not send it beside. */
const inHand = new Map<string, InHand>();

/**
 * Sends the question of a draft once, now or when there is a network, also when its page is left meanwhile; the draft
 * is gone as soon as the server has it.
 */
export function handOver(draftKey: string, post: (key: string) => Promise<Question>): Promise<Question> {
  const already = inHand.get(draftKey);
  if (already) return already.promise;
  const send = async (key: string): Promise<Question> => {
    if (hand.isTakenBack) throw new TakenBack('taken back');
    return post(key);
  };
  const promise = Promise.resolve()
    .then(() => sendWhenOnline(draftKey, send))
    .then(async (question) => {
      await dropDraft(draftKey);
      return question;
    })
    .finally(() => {
      if (inHand.get(draftKey) === hand) inHand.delete(draftKey);
    });
  const hand: InHand = { promise, isTakenBack: false };
  inHand.set(draftKey, hand);
  return promise;
}

/** Stops what still waits for a network. What the server has already is asked. */
export function takeBack(draftKey: string): void {
  const hand = inHand.get(draftKey);
  if (hand) hand.isTakenBack = true;
  inHand.delete(draftKey);
}
