import { type ReactNode, useEffect, useRef, useState } from 'react';
import { TextField } from '../../components/field';

/** So long after the last key the words are looked for. */
const PAUSE_MS = 400;
const WORDS_MAX = 200;

interface WordsFieldProps {
  readonly words: string;
  readonly onChange: (words: string) => void;
}

/** Looks once the typing pauses, and follows the address when that is changed by the way back. */
export function WordsField({ words, onChange }: WordsFieldProps): ReactNode {
  const [typed, setTyped] = useState(words);
  const told = useRef(words);
  const tell = useRef(onChange);
  useEffect(() => void (tell.current = onChange));
  useEffect(() => {
    if (words === told.current) return;
    told.current = words;
    setTyped(words);
  }, [words]);
  useEffect(() => {
    const next = typed.trim();
    if (next === told.current) return;
    const due = setTimeout(() => {
      told.current = next;
      tell.current(next);
    }, PAUSE_MS);
    return () => clearTimeout(due);
  }, [typed]);
  return (
    <TextField
      label="Words or numbers"
      type="search"
      placeholder="doubler, #30, 0.250"
      maxLength={WORDS_MAX}
      value={typed}
      onChange={setTyped}
    />
  );
}
