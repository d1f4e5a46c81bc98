import type { Audience, Build, Membership } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField } from '../../components/field';
import type { AskDraft } from './ask-draft';
import classes from './ask.module.css';

interface AudienceFieldsProps<D extends AskDraft> {
  readonly draft: D;
  readonly onChange: (draft: D) => void;
  readonly builds: readonly Build[];
  /** Chapters in which the asker is a builder. */
  readonly chapters: readonly Membership[];
  readonly errors: Readonly<Record<string, string>>;
}

/** On which aircraft, and who is asked. With one build and one chapter there is nothing to choose but how far it goes. */
export function AudienceFields<D extends AskDraft>(props: AudienceFieldsProps<D>): ReactNode {
  const { draft, onChange, builds, chapters, errors } = props;
  const chapter = chapters.find(({ chapterId }) => chapterId === draft.chapterId);
  const audiences: { value: Audience; label: string }[] = [
    { value: 'chapter', label: chapter ? `${chapter.chapterName} alone` : 'the chapter alone' },
    { value: 'kit', label: 'all chapters of the kit' },
  ];
  function handleBuild(id: string) {
    const build = builds.find((one) => one.id === id);
    const isOfBuild = chapters.some(({ chapterId }) => chapterId === build?.chapterId);
    onChange({
      ...draft,
      buildId: build?.id ?? null,
      chapterId: isOfBuild ? build!.chapterId : draft.chapterId,
      place:
        build && build.kitId !== draft.place.kitId ? { ...draft.place, kitId: build.kitId } : draft.place,
    });
  }
  return (
    <div className={classes['three']}>
      {builds.length > 1 && (
        <ChoiceField
          label="Build"
          value={draft.buildId ?? ''}
          field="buildId"
          error={errors['buildId']}
          choices={[
            { value: '', label: 'none of them' },
            ...builds.map(({ id, kitName, serial }) => ({
              value: id,
              label: `${kitName}, serial ${serial}`,
            })),
          ]}
          onChange={handleBuild}
        />
      )}
      {chapters.length > 1 && (
        <ChoiceField
          label="Chapter"
          value={draft.chapterId ?? ''}
          field="chapterId"
          error={errors['chapterId']}
          choices={chapters.map(({ chapterId, chapterName }) => ({ value: chapterId, label: chapterName }))}
          onChange={(chapterId) => onChange({ ...draft, chapterId })}
        />
      )}
      <ChoiceField
        label="Who is asked"
        value={draft.audience}
        field="audience"
        error={errors['audience']}
        choices={audiences}
        onChange={(audience) => onChange({ ...draft, audience })}
      />
    </div>
  );
}
