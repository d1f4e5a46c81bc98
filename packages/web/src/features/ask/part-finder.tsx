import type { Part } from '@rivetside/shared';
import { useState, type ReactNode } from 'react';
import { TextField } from '../../components/field';
import classes from './ask.module.css';

interface PartFinderProps {
  /** Parts whose number or name has the words; undefined while they are looked for. */
  readonly found: readonly Part[] | undefined;
  readonly onSearch: (words: string) => void;
  readonly onPick: (part: Part) => void;
}

const WORDS_LEAST = 2;

/** Any part of the kit by its number or name. Picking one fills its section in. */
export function PartFinder({ found, onSearch, onPick }: PartFinderProps): ReactNode {
  const [words, setWords] = useState('');
  const isAsked = words.trim().length >= WORDS_LEAST;
  function handleChange(next: string) {
    setWords(next);
    onSearch(next.trim().length >= WORDS_LEAST ? next.trim() : '');
  }
  function handlePick(part: Part) {
    handleChange('');
    onPick(part);
  }
  return (
    <div className={classes['finder']}>
      <TextField
        label="Find a part by its number"
        type="search"
        value={words}
        placeholder="STB/dr-03"
        autoComplete="off"
        onChange={handleChange}
      />
      <div role="status" className={classes['foundCount']}>
        {isAsked && found?.length === 0 && 'No part has that number or name.'}
        {isAsked && found && found.length > 0 && `${found.length} found`}
      </div>
      {isAsked && found && found.length > 0 && (
        <ul className={classes['found']} aria-label="Parts found">
          {found.map((part) => (
            <li key={part.id}>
              <button type="button" onClick={() => handlePick(part)}>
                <span className={classes['call']}>{part.number}</span> {part.name}
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
