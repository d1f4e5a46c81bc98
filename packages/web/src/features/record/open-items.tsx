import type { OpenItem } from '@rivetside/shared';
import { lazy, type ReactNode, Suspense, useEffect, useRef, useState } from 'react';
import { Link } from 'react-router-dom';
import { useTimes } from '../../lib/times';
import classes from './record.module.css';

const ClearDialog = lazy(async () => ({ default: (await import('./clear-dialog')).ClearDialog }));

interface OpenItemsProps {
  readonly items: readonly OpenItem[];
  readonly label: string;
  /** Owner and crew clear; others read. */
  readonly mayClear: boolean;
  /** All are of one section, which is named already. */
  readonly isOfOneSection?: boolean;
}

/** What must be cleared before a section is closed. */
export function OpenItems({ items, label, mayClear, isOfOneSection = false }: OpenItemsProps): ReactNode {
  const [clearing, setClearing] = useState<OpenItem | null>(null);
  const [cleared, setCleared] = useState<OpenItem | null>(null);
  const list = useRef<HTMLDivElement>(null);
  // The dialog gives the focus back to its button, and that is gone with what was cleared.
  useEffect(() => {
    if (cleared) list.current?.focus();
  }, [cleared]);
  const handleCleared = (item: OpenItem) => {
    setClearing(null);
    setCleared(item);
  };
  return (
    <div ref={list} tabIndex={-1} className={classes['openItems']}>
      <p role="status" className="unseen">
        {cleared && `Cleared: ${cleared.text}`}
      </p>
      <ul className={classes['list']} aria-label={label}>
        {items.map((item) => (
          <li key={item.id} className={classes['item']}>
            <ItemWords item={item} section={isOfOneSection ? null : item.sectionName} />
            {mayClear && (
              <button
                type="button"
                className="btn plain"
                aria-label={`Clear: ${item.text}`}
                onClick={() => setClearing(item)}
              >
                Clear
              </button>
            )}
          </li>
        ))}
      </ul>
      {clearing && (
        <Suspense>
          <ClearDialog item={clearing} onClose={() => setClearing(null)} onCleared={handleCleared} />
        </Suspense>
      )}
    </div>
  );
}

interface ItemWordsProps {
  readonly item: OpenItem;
  readonly section: string | null;
}

function ItemWords({ item, section }: ItemWordsProps): ReactNode {
  const { date } = useTimes();
  const { text, due, raisedAt, questionId } = item;
  return (
    <div>
      <b>{text}</b>
      <small>
        {[section, due && `due ${due}`, `raised ${date(raisedAt)}`].filter(Boolean).join(' · ')}
        {questionId && (
          <>
            {' · '}
            <Link to={`/questions/${questionId}`}>its question</Link>
          </>
        )}
      </small>
    </div>
  );
}

/** What was cleared stays readable, with what was done. */
export function ClearedItems({ items }: { readonly items: readonly OpenItem[] }): ReactNode {
  const { date } = useTimes();
  return (
    <details className={classes['cleared']}>
      <summary>{items.length === 1 ? 'One cleared' : `${items.length} cleared`}</summary>
      <ul className={classes['list']} aria-label="Cleared items">
        {items.map(({ id, text, clearedAt, clearedNote }) => (
          <li key={id} className={classes['item']}>
            <div>
              <b>{text}</b>
              <small>
                {clearedAt && `cleared ${date(clearedAt)}`}
                {clearedNote && `: ${clearedNote}`}
              </small>
            </div>
          </li>
        ))}
      </ul>
    </details>
  );
}
