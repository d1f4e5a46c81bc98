import { type ReactNode, type SyntheticEvent, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import classes from './top-bar.module.css';

/** One field over questions, parts, steps and notices; the answers have a page of their own. */
export function FindField({ onFind }: { readonly onFind?: () => void }): ReactNode {
  const [query] = useSearchParams();
  const [words, setWords] = useState(query.get('q') ?? '');
  const navigate = useNavigate();
  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    if (words.trim() === '') return;
    onFind?.();
    void navigate(`/search?q=${encodeURIComponent(words.trim())}`);
  };
  return (
    <form role="search" className={classes['find']} onSubmit={handleSubmit}>
      <input
        type="search"
        name="q"
        aria-label="Find"
        placeholder="Find a part, a step, a drill size…"
        value={words}
        maxLength={200}
        enterKeyHint="search"
        onChange={(event) => setWords(event.currentTarget.value)}
      />
    </form>
  );
}
