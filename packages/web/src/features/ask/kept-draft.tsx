import { useState, type ReactNode } from 'react';
import classes from './ask-layout.module.css';

interface KeptDraftProps {
  /** The first words of it, if it has any. */
  readonly title: string;
  readonly onGoOn: () => void;
  readonly onBeginAnew: () => void;
}

/** Somebody comes from a place on the kit while a question about another is half written. */
export function KeptDraft({ title, onGoOn, onBeginAnew }: KeptDraftProps): ReactNode {
  return (
    <div className={classes['kept']} role="status">
      <p>
        A draft is kept on this device{title ? `: “${title}”` : ''}. You came from another place on the kit.
      </p>
      <button type="button" className="btn" onClick={onGoOn}>
        Go on with the draft
      </button>
      <button type="button" className="btn plain" onClick={onBeginAnew}>
        Throw it away and begin here
      </button>
    </div>
  );
}

/** Twice to be pressed: nothing brings it back. */
export function ThrowAway({ onThrowAway }: { onThrowAway: () => void }): ReactNode {
  const [isAsking, setAsking] = useState(false);
  if (!isAsking)
    return (
      <button type="button" className="btn plain" onClick={() => setAsking(true)}>
        Throw this draft away
      </button>
    );
  return (
    <div className={classes['kept']} role="group" aria-label="Throw this draft away?">
      <p>Text, hole card and photos of this draft go. Nothing brings them back.</p>
      <button type="button" className="btn" autoFocus onClick={() => setAsking(false)}>
        Keep it
      </button>
      <button
        type="button"
        className="btn plain"
        onClick={() => {
          setAsking(false);
          onThrowAway();
        }}
      >
        Throw it away
      </button>
    </div>
  );
}
