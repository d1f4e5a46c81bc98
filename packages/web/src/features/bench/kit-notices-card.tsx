import { NOTICE_CLASS_WORDS, NOTICE_CLASSES, type Notice } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { useTimes } from '../../lib/times';
import classes from './bench.module.css';

interface KitNoticesCardProps {
  readonly notices: {
    readonly data: { readonly items: readonly Notice[] } | undefined;
    readonly error: unknown;
    readonly refetch: () => unknown;
  };
  readonly serial: number;
}

/** Those that reach this serial, the most pressing first. */
export function noticesFor(notices: readonly Notice[], serial: number): Notice[] {
  const rank = (notice: Notice) => NOTICE_CLASSES.indexOf(notice.class);
  return notices
    .filter(({ serialFrom, serialTo }) => serialFrom <= serial && serial <= serialTo)
    .sort((a, b) => rank(a) - rank(b) || b.issuedOn.localeCompare(a.issuedOn));
}

/** The kit maker's notices that reach the build, each opening to its text. */
export function KitNoticesCard({ notices, serial }: KitNoticesCardProps): ReactNode {
  const { data, error, refetch } = notices;
  return (
    <PageCard title="Notices for your kit">
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : (
        <Notices notices={noticesFor(data.items, serial)} />
      )}
    </PageCard>
  );
}

function Notices({ notices }: { readonly notices: readonly Notice[] }): ReactNode {
  const { date } = useTimes();
  if (notices.length === 0)
    return <p className={classes['quiet']}>The kit maker has published nothing that reaches your serial.</p>;
  return (
    <ul className={classes['list']} aria-label="Notices for your kit">
      {notices.map((notice) => (
        <li key={notice.id} className={classes['notice']}>
          <details>
            <summary>
              <b>
                {notice.number}, {notice.title}
              </b>
              <small data-class={notice.class}>
                {NOTICE_CLASS_WORDS[notice.class]} · {date(notice.issuedOn)}
              </small>
            </summary>
            <p>{notice.text}</p>
            {notice.holes && <p>Holes: {notice.holes}</p>}
          </details>
        </li>
      ))}
    </ul>
  );
}
