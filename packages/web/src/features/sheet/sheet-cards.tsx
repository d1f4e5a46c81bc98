import { MISHAP_WORDS, type Question, type SimilarQuestion, STATE_WORDS } from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { FitCheckTable } from '../../components/fit-check-table';
import { HoleDrawingMini } from '../../components/hole-drawing-mini';
import { PageCard } from '../../components/page-card';
import { PhotoStrip } from '../../components/photo-strip';
import { LinesSkeleton } from '../../components/skeletons';
import { useUnits } from '../../lib/units';
import { similarTo } from './queries';
import classes from './sheet.module.css';

export function FitCheckPanel({ sheet: { fitCheck } }: { readonly sheet: Question }): ReactNode {
  const units = useUnits();
  if (!fitCheck) return null;
  return (
    <PageCard title="Fit check" aside={`engine ${fitCheck.engineVersion} · published practice, not approval`}>
      <FitCheckTable check={fitCheck} units={units} />
    </PageCard>
  );
}

/** What the builder wrote, as they wrote it. */
export function StoryPanel({ sheet: { body, mishap } }: { readonly sheet: Question }): ReactNode {
  return (
    <PageCard title="What is wrong" aside={MISHAP_WORDS[mishap].toLowerCase()}>
      <p className={classes['story']}>{body}</p>
    </PageCard>
  );
}

export function PhotosPanel({ sheet: { photos } }: { readonly sheet: Question }): ReactNode {
  if (photos.length === 0) return null;
  const marked = photos.some(({ marks }) => marks.length > 0);
  return (
    <PageCard title="Photos" aside={`${photos.length}${marked ? ', marked up' : ''}`}>
      <div className={classes['pad']}>
        <PhotoStrip photos={photos} />
      </div>
    </PageCard>
  );
}

/** A strip drawn to one scale, not a list with percentages. */
export function MetBeforePanel({ id }: { readonly id: string }): ReactNode {
  const { data, error } = useQuery(similarTo(id));
  return (
    <PageCard title="Met before" aside="drawn to the same scale">
      {error && !data ? (
        <p className={classes['quiet']}>Could not be looked for just now.</p>
      ) : !data ? (
        <LinesSkeleton lines={2} />
      ) : data.items.length === 0 ? (
        <p className={classes['quiet']}>Nothing like it was met here yet.</p>
      ) : (
        <ul className={classes['met']}>
          {data.items.map((one) => (
            <MetBefore key={one.question.id} one={one} />
          ))}
        </ul>
      )}
    </PageCard>
  );
}

function MetBefore({
  one: { question, holeCard, alikeIn, differsIn },
}: {
  readonly one: SimilarQuestion;
}): ReactNode {
  const words = [
    alikeIn.length > 0 && `alike in ${alikeIn.join(', ')}`,
    differsIn.length > 0 && `differs in ${differsIn.join(', ')}`,
    STATE_WORDS[question.state].toLowerCase(),
  ];
  return (
    <li>
      {holeCard && <HoleDrawingMini card={holeCard} label={`Hole card of ${question.number}`} />}
      <div>
        <Link to={`/questions/${question.id}`}>{question.title}</Link>
        <p className="muted">
          <CallOut>{question.number}</CallOut> {words.filter(Boolean).join(' · ')}
        </p>
      </div>
    </li>
  );
}
