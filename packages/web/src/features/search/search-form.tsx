import { searchQuerySchema } from '@rivetside/shared';
import { type ReactNode, type SyntheticEvent, useState } from 'react';
import { TextField } from '../../components/field';
import classes from './search.module.css';

interface SearchFormProps {
  readonly q: string;
  readonly onSearch: (q: string) => void;
}

/** One field over everything of the kit and whatever was asked about it. */
export function SearchForm({ q, onSearch }: SearchFormProps): ReactNode {
  const [typed, setTyped] = useState(q);
  const [fault, setFault] = useState<string>();
  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    const read = searchQuerySchema.shape.q.safeParse(typed);
    setFault(read.error?.issues[0]?.message);
    if (read.success) onSearch(read.data);
  };
  return (
    <form
      role="search"
      aria-label="Everything"
      noValidate
      className={classes['form']}
      onSubmit={handleSubmit}
    >
      <TextField
        label="Find"
        hint="Words, a part number, a drill or rivet, or numbers as measured."
        type="search"
        enterKeyHint="search"
        value={typed}
        error={fault}
        onChange={setTyped}
      />
      <button type="submit" className="btn">
        Find
      </button>
    </form>
  );
}
