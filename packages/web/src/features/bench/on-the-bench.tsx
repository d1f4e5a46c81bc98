import type { OpenItem, QuestionRow, Section, SectionSummary } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { RivetLine } from '../../components/rivet-line';
import { alsoBegun, progressWords, type StepLine, stepLines } from './section-in-hand';
import classes from './bench.module.css';

interface OnTheBenchProps {
  /** The kit as drawn, with this section chosen. */
  readonly plan: ReactNode;
  /** Which aircraft, in words. */
  readonly aircraft: string;
  readonly section: Section;
  readonly sections: readonly SectionSummary[];
  readonly questions: readonly QuestionRow[];
  readonly openItems: readonly OpenItem[];
}

/** The section in hand, step by step. */
export function OnTheBench(props: OnTheBenchProps): ReactNode {
  const { plan, aircraft, section, sections, questions, openItems } = props;
  const also = alsoBegun(sections, section);
  return (
    <section className={classes['hero']} aria-labelledby="on-the-bench">
      <div className={classes['plan']}>{plan}</div>
      <div>
        <p className={classes['over']}>On the bench now · {aircraft}</p>
        <h2 id="on-the-bench">
          <Link to={`/sections/${section.id}`}>{section.name}</Link>
          {section.critical && <small>critical</small>}
        </h2>
        <p className={classes['under']}>{progressWords(section)}</p>
        <ol className={classes['steps']} aria-label={`Steps of ${section.name}`}>
          {stepLines(section, questions, openItems).map((line) => (
            <StepRow key={line.step.id} line={line} />
          ))}
        </ol>
        <div className={classes['buttons']}>
          <Link className="btn" to={`/ask?sectionId=${section.id}`}>
            Ask about this section
          </Link>
          <Link className="btn plain" to={`/stop?sectionId=${section.id}`}>
            Something is wrong
          </Link>
        </div>
        {also.length > 0 && (
          <p className={classes['also']}>
            Also begun:
            {also.map(({ id, name }) => (
              <Link key={id} to={`/sections/${id}`}>
                {name}
              </Link>
            ))}
          </p>
        )}
      </div>
    </section>
  );
}

const STATE_WORDS = { todo: 'to do', pinned: 'pinned', driven: 'driven' } as const;

function StepRow({ line }: { readonly line: StepLine }): ReactNode {
  const { step, state, waitsOn, openItems } = line;
  return (
    <li>
      <span>
        {step.number}. {step.title}
      </span>
      <RivetLine states={[state]} label={`Step ${step.number}: ${STATE_WORDS[state]}`} />
      <span className={classes['waits']}>
        {waitsOn ? (
          <Link to={`/questions/${waitsOn.id}`}>waits on {waitsOn.number}</Link>
        ) : openItems > 0 ? (
          `${openItems} open ${openItems === 1 ? 'item' : 'items'}`
        ) : (
          <span aria-hidden="true">{STATE_WORDS[state]}</span>
        )}
      </span>
    </li>
  );
}
