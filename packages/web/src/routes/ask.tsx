import { HOLE_MISHAPS, type Me, type Units } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import { FaultSummary } from '../components/fault-summary';
import { NoPermissionPage } from '../components/pages/no-permission-page';
import { CardSkeleton } from '../components/skeletons';
import {
  blankDraft,
  changedFrom,
  isEmptyDraft,
  type AskDraft,
  type AskedPlace,
} from '../features/ask/ask-draft';
import { AskLayout } from '../features/ask/ask-layout';
import { AudienceFields } from '../features/ask/audience-fields';
import { KeptDraft, ThrowAway } from '../features/ask/kept-draft';
import { MetBefore } from '../features/ask/met-before';
import { buildsOfAsker, kitsToAsk } from '../features/ask/queries';
import { faultsWithin, readQuestion, type Faults } from '../features/ask/read-question';
import { SendBar } from '../features/ask/send-bar';
import { TroubleCard } from '../features/ask/trouble-card';
import { useAddressPlace } from '../features/ask/use-address-place';
import { useFaults } from '../features/ask/use-faults';
import { useMetBefore } from '../features/ask/use-met-before';
import { useSending } from '../features/ask/use-sending';
import { chaptersToAskIn, useWhere, type Where } from '../features/ask/use-where';
import { WherePart } from '../features/ask/where-part';
import { onOtherLine, usualCard } from '../features/hole-card/card-of-line';
import type { HoleCardFields } from '../features/hole-card/hole-card-fields';
import { HoleCardForm } from '../features/hole-card/hole-card-form';
import { HoleCardChecked, HoleCardDrawn } from '../features/hole-card/hole-card-outcome';
import { readHoleCard, type HoleCardReading } from '../features/hole-card/read-hole-card';
import { useHoleCard } from '../features/hole-card/use-hole-card';
import type { DraftPhoto } from '../features/photos/draft-photo';
import { DraftPhotos } from '../features/photos/draft-photos';
import { photoWire } from '../features/photos/photo-wire';
import { sendPhotos } from '../features/photos/send-photos';
import { useDraft, type Draft } from '../lib/drafts';
import { usePageTitle } from '../lib/page-title';
import { randomKey } from '../lib/random-key';
import { useActor } from '../lib/session';
import { useTimes } from '../lib/times';
import { useUnits } from '../lib/units';

type Asking = AskDraft<HoleCardFields, DraftPhoto>;

export const handle = { crumbs: () => [{ label: 'Questions', to: '/questions' }, { label: 'Ask' }] };

/** Begun, not waited for: without a network the draft is still there to be written on. */
export const loader = (queryClient: QueryClient) => () => {
  void queryClient.prefetchQuery(kitsToAsk);
  void queryClient.prefetchQuery(buildsOfAsker);
  return null;
};

type PhotoUpdate = (photos: readonly DraftPhoto[]) => readonly DraftPhoto[];

const NO_FAULTS: Faults = {};
const NOTHING_YET = blankDraft<HoleCardFields, DraftPhoto>();

export function Component() {
  usePageTitle('Ask');
  const me = useActor();
  const draftKey = `ask:${me.id}`;
  const draft = useDraft<Asking>(draftKey, NOTHING_YET);
  if (chaptersToAskIn(me).length === 0)
    return (
      <NoPermissionPage>
        <p>You ask in a chapter where you are a builder. Its chapter admin can make you one.</p>
      </NoPermissionPage>
    );
  if (!draft.loaded) return <CardSkeleton />;
  return <AskForm key={draftKey} draftKey={draftKey} draft={draft} me={me} />;
}

interface AskFormProps {
  readonly draftKey: string;
  readonly draft: Draft<Asking>;
  readonly me: Me;
}

/** Names the photos of the draft at the server, after sending whatever is not there yet. */
async function sendAll(
  photos: readonly DraftPhoto[],
  update: (next: PhotoUpdate) => void,
): Promise<string[]> {
  const keep = ({ key, sent }: DraftPhoto) =>
    update((old) => old.map((one) => (one.key === key ? { ...one, sent } : one)));
  const all = await sendPhotos(photoWire, photos, keep);
  return all.flatMap(({ sent }) => sent?.id ?? []);
}

/** The hole card of the draft, or what it begins with on the chosen hole line. */
function useAskedCard(asked: Asking, where: Where, units: Units) {
  const { drawn } = where;
  const fields = useMemo(() => asked.holeCard ?? usualCard(drawn, units), [asked.holeCard, drawn, units]);
  return { fields, hole: useHoleCard(fields, units) };
}

/** The card follows the place: another hole line is drawn otherwise. */
function cardAt(place: AskedPlace, { section }: Where, old: Asking, units: Units): HoleCardFields | null {
  if (place.holeLineId === old.place.holeLineId) return old.holeCard;
  const line = section?.holeLines.find(({ id }) => id === place.holeLineId);
  return onOtherLine(old.holeCard, line && section ? { line, critical: section.critical } : null, units);
}

const NO_CARD = { holeCard: null, holeCardErrors: {} };

function AskForm({ draftKey, draft, me }: AskFormProps) {
  const units = useUnits();
  const times = useTimes();
  const { value, set, savedAt } = draft;
  const { asked, ...where } = useWhere(value, me);
  const address = useAddressPlace(draft);
  const isHole = asked.mishap !== null && HOLE_MISHAPS.includes(asked.mishap);
  const { fields, hole } = useAskedCard(asked, where, units);
  const met = useMetBefore(asked, isHole ? hole.card : null);
  const faults = useFaults();
  const filledIn = { ...asked, holeCard: fields };

  const setPhotos = useCallback(
    (update: PhotoUpdate) => set((old) => ({ ...old, photos: update(old.photos) })),
    [set],
  );
  const change = (next: Asking) => set((old) => ({ ...old, ...changedFrom(asked, next) }));
  const setFields = useCallback((holeCard: HoleCardFields) => set((old) => ({ ...old, holeCard })), [set]);
  const setPlace = (place: AskedPlace) =>
    set((old) => ({ ...old, place, holeCard: cardAt(place, where, old, units) }));

  const sending = useSending({
    draftKey,
    draft,
    askedById: me.id,
    sendPhotos: () => sendAll(value.photos, setPhotos),
    onRefused: (error) => {
      const { errors } = faults.refused(error, filledIn, hole.reading.fieldOf);
      // They wait for a question a few days only: then they are sent anew, as others.
      if (errors['photoIds'])
        setPhotos((old) => old.map((one) => ({ ...one, key: randomKey(), sent: null })));
    },
  });

  const read = ({ card, errors }: Pick<HoleCardReading, 'card' | 'errors'>) =>
    readQuestion(asked, {
      line: where.line,
      ...(isHole ? { holeCard: card, holeCardErrors: errors } : NO_CARD),
    });
  function handleSubmit() {
    if (sending.standing !== 'writing') return;
    // Read anew: what the drawing shows may be a keystroke behind.
    const { question, errors } = read(readHoleCard(fields, units));
    if (!question) return faults.refuse(errors);
    faults.clear();
    set((old) => ({ ...old, handedOver: question }));
  }
  const errors = faults.tries === 0 ? NO_FAULTS : faults.standing(filledIn, read(hole.reading).errors);

  return (
    <AskLayout
      onSubmit={handleSubmit}
      isLocked={sending.standing !== 'writing'}
      keptAt={savedAt && times.time(savedAt.toISOString())}
      summary={
        address.isInTheWay ? (
          <KeptDraft title={value.title} onGoOn={address.goOn} onBeginAnew={address.beginAnew} />
        ) : (
          <FaultSummary title="Not sent yet:" faults={faults.summary(errors)} tries={faults.tries} />
        )
      }
      where={
        <WherePart where={where} units={units} errors={errors} onPlace={setPlace}>
          <AudienceFields
            draft={asked}
            onChange={change}
            builds={where.builds}
            chapters={where.chapters}
            errors={errors}
          />
        </WherePart>
      }
      trouble={<TroubleCard draft={asked} onChange={change} errors={errors} />}
      hole={
        isHole
          ? {
              form: (
                <HoleCardForm
                  value={fields}
                  onChange={setFields}
                  units={units}
                  reading={hole.reading}
                  errors={faultsWithin('holeCard', errors)}
                  drill={where.line?.drill}
                  isRivetSet={asked.mishap === 'badRivet'}
                />
              ),
              drawing: <HoleCardDrawn hole={hole} units={units} onChange={setFields} />,
              check: <HoleCardChecked hole={hole} units={units} />,
            }
          : null
      }
      photos={<DraftPhotos photos={value.photos} onChange={setPhotos} error={errors['photoIds']} />}
      metBefore={<MetBefore {...met} />}
      send={<SendBar standing={sending.standing} onTakeBack={sending.takeBack} />}
      foot={!isEmptyDraft(value) && <ThrowAway onThrowAway={() => set(NOTHING_YET)} />}
    />
  );
}
