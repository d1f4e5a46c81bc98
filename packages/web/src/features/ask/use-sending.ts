import type { Question } from '@rivetside/shared';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import type { Draft } from '../../lib/drafts';
import { session } from '../../lib/session';
import type { AskDraft } from './ask-draft';
import { TakenBack } from './hand-over';
import { askQuestion } from './queries';
import { useHandOver } from './use-hand-over';

interface Sending<C, P> {
  readonly draftKey: string;
  readonly draft: Draft<AskDraft<C, P>>;
  readonly askedById: string;
  /** Brings every photo to the server that is not there yet and names them all. */
  readonly sendPhotos: () => Promise<string[]>;
  readonly onRefused: (error: unknown) => void;
}

/** Sends what was handed over: photos first, then the question, and opens its sheet. */
export function useSending<C, P>({ draftKey, draft, askedById, sendPhotos, onRefused }: Sending<C, P>) {
  const navigate = useNavigate();
  const queryClient = useQueryClient();
  const { handedOver } = draft.value;

  async function post(key: string): Promise<Question> {
    // Whoever signed in meanwhile does not ask what another wrote.
    if (!handedOver || session.me()?.id !== askedById) throw new TakenBack('not theirs');
    const photoIds = await sendPhotos();
    return askQuestion({ ...handedOver, photoIds }, key);
  }
  const release = () => draft.set((old) => ({ ...old, handedOver: null }));
  const { standing, takeBack } = useHandOver({
    draftKey,
    isHandedOver: handedOver !== null,
    post,
    onAsked: ({ id }) => {
      void draft.drop();
      for (const prefix of ['questions', 'sections', 'desk']) {
        void queryClient.invalidateQueries({ queryKey: [prefix] });
      }
      void navigate(`/questions/${id}`);
    },
    onRefused: (error) => {
      release();
      onRefused(error);
    },
  });
  return {
    standing,
    takeBack: () => {
      takeBack();
      release();
    },
  };
}
