import { useEffect, useState, type ReactNode } from 'react';
import { TextField } from '../../components/field';
import type { DraftPhoto } from './draft-photo';
import classes from './photos.module.css';
import type { Sending } from './use-photo-sending';

interface PhotoRowProps {
  readonly photo: DraftPhoto;
  readonly index: number;
  readonly count: number;
  readonly sending: Sending | null;
  readonly isOnline: boolean;
  readonly onChange: (photo: DraftPhoto) => void;
  readonly onMove: (by: 1 | -1) => void;
  readonly onRemove: () => void;
  readonly onCancel: () => void;
  readonly onRetry: () => void;
}

const RIVETS = 10;

/** How much of the photo is sent: a line of rivets, driven one by one. */
function SentLine({ part, name }: { part: number; name: string }): ReactNode {
  const driven = Math.round(part * RIVETS);
  return (
    <svg
      className={classes['line']}
      viewBox={`0 0 ${RIVETS * 14} 14`}
      width={RIVETS * 14}
      height="14"
      role="progressbar"
      aria-label={`Sending ${name}`}
      aria-valuenow={Math.round(part * 100)}
      aria-valuemin={0}
      aria-valuemax={100}
    >
      {Array.from({ length: RIVETS }, (_, index) => (
        <circle key={index} cx={index * 14 + 7} cy="7" r="4.5" data-driven={index < driven} />
      ))}
    </svg>
  );
}

function usePreview(file: Blob): string | undefined {
  const [url, setUrl] = useState<string>();
  useEffect(() => {
    const made = URL.createObjectURL(file);
    setUrl(made);
    return () => URL.revokeObjectURL(made);
  }, [file]);
  return url;
}

function Standing(props: PhotoRowProps & { name: string }): ReactNode {
  const { photo, sending, isOnline, name, onCancel, onRetry } = props;
  if (sending?.kind === 'failed') {
    return (
      <p className={classes['failed']} role="alert">
        {sending.reason}{' '}
        <button type="button" onClick={onRetry}>
          Send again
        </button>
      </p>
    );
  }
  if (sending?.kind === 'sending') {
    return (
      <p className={classes['standing']}>
        <SentLine part={sending.part} name={name} />
        <button type="button" onClick={onCancel} aria-label={`Stop sending ${name}`}>
          Stop
        </button>
      </p>
    );
  }
  if (photo.sent) return <p className={classes['standing']}>Sent; the place it was taken is removed.</p>;
  const waits =
    isOnline && !sending
      ? 'Waits for its turn.'
      : 'Kept on this device; it is sent when the network is back.';
  return <p className={classes['standing']}>{waits}</p>;
}

/** One photo of the draft: what it shows, how far it is, and its place among the others. */
export function PhotoRow(props: PhotoRowProps): ReactNode {
  const { photo, index, count, onChange, onMove, onRemove } = props;
  const url = usePreview(photo.file);
  const name = photo.caption.trim() || `photo ${index + 1}`;
  return (
    <li className={classes['photo']}>
      <img src={url} alt={`Your ${name}`} width="132" height="99" />
      <div className={classes['told']}>
        <TextField
          label={`What photo ${index + 1} shows`}
          value={photo.caption}
          maxLength={300}
          placeholder="hole 7, rule in the picture"
          onChange={(caption) => onChange({ ...photo, caption })}
        />
        <Standing {...props} name={name} />
      </div>
      <div className={classes['order']}>
        <button
          type="button"
          disabled={index === 0}
          aria-label={`Move ${name} earlier`}
          onClick={() => onMove(-1)}
        >
          Earlier
        </button>
        <button
          type="button"
          disabled={index === count - 1}
          aria-label={`Move ${name} later`}
          onClick={() => onMove(1)}
        >
          Later
        </button>
        <button type="button" aria-label={`Take out ${name}`} onClick={onRemove}>
          Take out
        </button>
      </div>
    </li>
  );
}
