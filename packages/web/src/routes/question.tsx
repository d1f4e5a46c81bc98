import { canCarryOut, type Fix, hasDesk, type Me, type Question } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { lazy, Suspense, useState } from 'react';
import { type LoaderFunctionArgs, useParams } from 'react-router-dom';
import { AdviceLine } from '../components/advice-line';
import { ErrorPage } from '../components/pages/error-page';
import { NotFoundPage } from '../components/pages/not-found-page';
import { CardSkeleton, LinesSkeleton } from '../components/skeletons';
import endorseClasses from '../features/endorsements/endorsements.module.css';
import { StampRow } from '../features/endorsements/stamp-row';
import { CompletionCard } from '../features/fixes/completion-card';
import { FixCard } from '../features/fixes/fix-card';
import { hasOutsideLine, isMentorHere, whyNoFix, whyNoStamp } from '../features/fixes/fix-words';
import { NoFixYet } from '../features/fixes/no-fix-yet';
import { HoleCardPanel } from '../features/sheet/hole-card-panel';
import { questionSheet, sheetKeys, sheetWire } from '../features/sheet/queries';
import { SheetActions } from '../features/sheet/sheet-actions';
import { FitCheckPanel, MetBeforePanel, PhotosPanel, StoryPanel } from '../features/sheet/sheet-cards';
import { hasEarlierEvents, withEarlierEvents } from '../features/sheet/sheet-events';
import { SheetHead } from '../features/sheet/sheet-head';
import { SheetLayout } from '../features/sheet/sheet-layout';
import { useLiveSheet } from '../features/sheet/use-live-sheet';
import { useSeen } from '../features/sheet/use-seen';
import type { PhotoSlot } from '../features/talk/say-form';
import { TalkCard } from '../features/talk/talk-card';
import { usePageTitle } from '../lib/page-title';
import { Problem } from '../lib/problem';
import { useActor } from '../lib/session';
import { standingOf } from '../lib/standing';

// Whoever only reads a sheet needs none of these: each comes when it is opened.
const EndorseDialog = lazy(async () => ({
  default: (await import('../features/endorsements/endorse-dialog')).EndorseDialog,
}));
const CarryOutDialog = lazy(async () => ({
  default: (await import('../features/fixes/carry-out-dialog')).CarryOutDialog,
}));
const ProposeDialog = lazy(async () => ({
  default: (await import('../features/fixes/propose-dialog')).ProposeDialog,
}));
const DraftPhotos = lazy(async () => ({
  default: (await import('../features/photos/draft-photos')).DraftPhotos,
}));

export const handle = { crumbs: () => [{ label: 'Questions', to: '/questions' }, { label: 'Sheet' }] };

export const loader =
  (queryClient: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void queryClient.prefetchQuery(questionSheet(params['questionId']!));
    return null;
  };

export function Component() {
  const id = useParams()['questionId']!;
  const { data: sheet, error, refetch } = useQuery(questionSheet(id));
  usePageTitle(sheet ? `${sheet.number}, ${sheet.title}` : 'Question');
  if (error instanceof Problem && error.status === 404) return <NotFoundPage what="question" />;
  if (error && !sheet) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!sheet) return <CardSkeleton lines={10} />;
  return <Sheet key={id} sheet={sheet} />;
}

const photoSlot: PhotoSlot = (props) => (
  <Suspense fallback={<LinesSkeleton lines={1} />}>
    <DraftPhotos {...props} />
  </Suspense>
);

function Sheet({ sheet }: { readonly sheet: Question }) {
  const me = useActor();
  const queryClient = useQueryClient();
  const live = useLiveSheet(sheet.id);
  const seenBefore = useSeen(sheet);
  const showEarlier = async () => {
    const { items } = await sheetWire.eventsBefore(sheet.id, sheet.events[0]?.seq ?? 1);
    queryClient.setQueryData<Question>(
      sheetKeys.one(sheet.id),
      (known) => known && withEarlierEvents(known, items),
    );
  };
  return (
    <>
      <SheetHead sheet={sheet} people={live.people} />
      <SheetLayout
        sheet={sheet}
        isCutOff={live.isCutOff}
        left={
          <>
            <HoleCardPanel sheet={sheet} />
            <FitCheckPanel sheet={sheet} />
            <StoryPanel sheet={sheet} />
            <PhotosPanel sheet={sheet} />
          </>
        }
        fixes={<Fixes sheet={sheet} me={me} />}
        talk={
          <TalkCard
            sheet={sheet}
            me={me}
            people={live.people}
            seenBefore={seenBefore}
            hasEarlier={hasEarlierEvents(sheet)}
            onEarlier={showEarlier}
            onSent={live.take}
            onWriting={live.writing}
            photoSlot={photoSlot}
          />
        }
        met={<MetBeforePanel id={sheet.id} />}
      />
      <AdviceLine />
    </>
  );
}

interface OwnProps {
  readonly sheet: Question;
  readonly me: Me;
}

function Fixes({ sheet, me }: OwnProps) {
  const [isProposing, setProposing] = useState(false);
  const isBuilder = canCarryOut(me, standingOf(sheet, me));
  const whyNot = whyNoFix(sheet, me);
  const propose = (
    <NoFixYet
      sheet={sheet}
      whyNot={hasDesk(me) ? whyNot : null}
      onPropose={whyNot === null ? () => setProposing(true) : undefined}
    />
  );
  return (
    <>
      <CompletionCard sheet={sheet} isBuilder={isBuilder} />
      {sheet.fixes.map((fix) => (
        <FixCard
          key={fix.id}
          sheet={sheet}
          fix={fix}
          me={me}
          stamps={<StampRow fix={fix} me={me} give={<Give sheet={sheet} fix={fix} me={me} />} />}
          carryOut={isBuilder ? <CarryOut sheet={sheet} fix={fix} /> : null}
        />
      ))}
      {propose}
      <SheetActions sheet={sheet} me={me} />
      <Suspense fallback={null}>
        {isProposing && <ProposeDialog sheet={sheet} onClose={() => setProposing(false)} />}
      </Suspense>
    </>
  );
}

function Give({ sheet, fix, me }: OwnProps & { readonly fix: Fix }) {
  const [isOpen, setOpen] = useState(false);
  if (!isMentorHere(sheet, me)) return null;
  const whyNot = whyNoStamp(sheet, fix, me);
  return (
    <div className={endorseClasses['give']}>
      {whyNot ? (
        <p>{whyNot}</p>
      ) : (
        <button type="button" className="btn" onClick={() => setOpen(true)}>
          Endorse
        </button>
      )}
      <Suspense fallback={null}>
        {isOpen && (
          <EndorseDialog
            sheet={sheet}
            fix={fix}
            me={me}
            isOutside={hasOutsideLine(fix)}
            onClose={() => setOpen(false)}
          />
        )}
      </Suspense>
    </div>
  );
}

/** Only once it is endorsed: until then the sheet says what it waits for. */
function CarryOut({ sheet, fix }: { readonly sheet: Question; readonly fix: Fix }) {
  const [isOpen, setOpen] = useState(false);
  const isLive = fix.endorsements.some(({ state }) => state === 'live');
  if (sheet.state !== 'endorsed' || fix.withdrawn || !isLive) return null;
  return (
    <>
      <button type="button" className="btn" onClick={() => setOpen(true)}>
        Carry it out
      </button>
      <Suspense fallback={null}>
        {isOpen && (
          <CarryOutDialog sheet={sheet} fix={fix} onClose={() => setOpen(false)} photoSlot={photoSlot} />
        )}
      </Suspense>
    </>
  );
}
