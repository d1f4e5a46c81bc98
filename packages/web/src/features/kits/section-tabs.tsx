import type { Section, Step } from '@rivetside/shared';
import { type KeyboardEvent, type ReactNode, useId, useRef, useState } from 'react';
import { HoleLineTable } from './hole-line-table';
import { MetHereList } from './met-here-list';
import { NoticeList } from './notice-list';
import { PartTable } from './part-table';
import { StepTable } from './step-table';
import classes from './kits.module.css';

interface SectionTabsProps {
  readonly section: Section;
  readonly mayAsk: boolean;
  readonly progressOf?: ((step: Step) => ReactNode) | undefined;
  readonly first?: 'parts' | 'steps';
  /** Of the reader's own build, where they have one. */
  readonly serial?: number | undefined;
}

function tabsOf({ section, mayAsk, progressOf, serial }: SectionTabsProps) {
  const { parts, steps, holeLines, metHere, notices } = section;
  const asking = { section, mayAsk };
  return [
    { key: 'parts', label: `Parts ${parts.length}`, body: <PartTable {...asking} /> },
    {
      key: 'steps',
      label: `Steps ${steps.length}`,
      body: <StepTable {...asking} progressOf={progressOf} />,
    },
    { key: 'lines', label: `Hole lines ${holeLines.length}`, body: <HoleLineTable {...asking} /> },
    { key: 'met', label: `What others met ${metHere.length}`, body: <MetHereList section={section} /> },
    {
      key: 'notices',
      label: `Notices ${notices.length}`,
      body: <NoticeList notices={notices} serial={serial} />,
    },
  ];
}

/** A section's parts, steps, hole lines, what others met and notices, one at a time. */
export function SectionTabs(props: SectionTabsProps): ReactNode {
  const { section, first = 'parts' } = props;
  const id = useId();
  const buttons = useRef<(HTMLButtonElement | null)[]>([]);
  const tabs = tabsOf(props);
  const [chosen, setChosen] = useState<string>(first);
  const move = (event: KeyboardEvent, at: number) => {
    const step = { ArrowRight: 1, ArrowLeft: -1 }[event.key];
    if (!step) return;
    const next = (at + step + tabs.length) % tabs.length;
    setChosen(tabs[next]!.key);
    buttons.current[next]?.focus();
  };
  return (
    <>
      <div role="tablist" aria-label={`What there is in ${section.name}`} className={classes['tabs']}>
        {tabs.map(({ key, label }, at) => (
          <button
            key={key}
            ref={(button) => void (buttons.current[at] = button)}
            type="button"
            role="tab"
            id={`${id}${key}`}
            aria-selected={key === chosen}
            aria-controls={key === chosen ? `${id}${key}-panel` : undefined}
            tabIndex={key === chosen ? 0 : -1}
            className={classes['tab']}
            onClick={() => setChosen(key)}
            onKeyDown={(event) => move(event, at)}
          >
            {label}
          </button>
        ))}
      </div>
      {tabs
        .filter(({ key }) => key === chosen)
        .map(({ key, body }) => (
          <div key={key} role="tabpanel" id={`${id}${key}-panel`} aria-labelledby={`${id}${key}`}>
            {body}
          </div>
        ))}
    </>
  );
}
