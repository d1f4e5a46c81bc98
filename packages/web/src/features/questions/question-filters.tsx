import { DISCIPLINE_WORDS, DISCIPLINES, type Discipline } from '@rivetside/shared';
import { type ReactNode, useId, useState } from 'react';
import { ChoiceField, type Choice, TickField } from '../../components/field';
import { narrowings } from './filter-of-address';
import type { QuestionFilter } from './queries';
import { QuestionRacks } from './question-racks';
import { WordsField } from './words-field';
import classes from './questions.module.css';

type Sort = NonNullable<QuestionFilter['sort']>;
const SORTS: readonly Choice<Sort>[] = [
  { value: 'activity', label: 'Last written on first' },
  { value: 'waiting', label: 'Longest waiting first' },
  { value: 'newest', label: 'Last asked first' },
];
const DISCIPLINE_CHOICES: readonly Choice<Discipline | ''>[] = [
  { value: '', label: 'Every discipline' },
  ...DISCIPLINES.map((value) => ({ value, label: DISCIPLINE_WORDS[value] })),
];

export interface QuestionFiltersProps {
  readonly filter: QuestionFilter;
  readonly onChange: (next: QuestionFilter) => void;
  readonly sections: readonly Choice[];
  readonly chapters: readonly Choice[];
}

/** What the list is narrowed by. On a phone it is folded away: the list is what one came for. */
export function QuestionFilters(props: QuestionFiltersProps): ReactNode {
  const { filter, onChange } = props;
  const [isOpen, setOpen] = useState(false);
  const id = useId();
  const count = narrowings(filter);
  return (
    <div className={classes['filters']}>
      <div className={classes['unfold']}>
        <button
          type="button"
          className="btn plain"
          aria-expanded={isOpen}
          aria-controls={id}
          onClick={() => setOpen(!isOpen)}
        >
          {count > 0 ? `Narrow down, ${count} set` : 'Narrow down'}
        </button>
      </div>
      <div id={id} className={classes['folded']} data-open={isOpen || undefined}>
        <QuestionRacks filter={filter} />
        <div className={classes['fields']}>
          <FilterFields {...props} />
          <TickField
            label="Only mine"
            isOn={filter.mine === 'true'}
            onChange={(isOn) => onChange({ ...filter, mine: isOn ? 'true' : undefined })}
          />
        </div>
      </div>
    </div>
  );
}

function FilterFields({ filter, onChange, sections, chapters }: QuestionFiltersProps): ReactNode {
  const set = (part: QuestionFilter) => onChange({ ...filter, ...part });
  return (
    <>
      <WordsField words={filter.q ?? ''} onChange={(q) => set({ q: q === '' ? undefined : q })} />
      <ChoiceField
        label="Section"
        value={filter.sectionId ?? ''}
        choices={[{ value: '', label: 'Every section' }, ...sections]}
        onChange={(value) => set({ sectionId: value || undefined, partId: undefined, holeLineId: undefined })}
      />
      <ChoiceField
        label="Discipline"
        value={filter.discipline ?? ''}
        choices={DISCIPLINE_CHOICES}
        onChange={(value) => set({ discipline: value || undefined })}
      />
      {chapters.length > 1 && (
        <ChoiceField
          label="Chapter"
          value={filter.chapterId ?? ''}
          choices={[{ value: '', label: 'Every chapter' }, ...chapters]}
          onChange={(value) => set({ chapterId: value || undefined })}
        />
      )}
      <ChoiceField
        label="Order"
        value={filter.sort ?? 'activity'}
        choices={SORTS}
        onChange={(sort) => set({ sort })}
      />
    </>
  );
}
