import type { Section, Step } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { CallOut } from '../../components/call-out';
import { FactTable } from './fact-table';
import { SomethingWrong } from './something-wrong';
import classes from './kits.module.css';

interface StepTableProps {
  readonly section: Section;
  readonly mayAsk: boolean;
  /** How far the reader has come in a step, where they build one. */
  readonly progressOf?: ((step: Step) => ReactNode) | undefined;
}

/** The steps in the order of the manual, with what may hurt in them. */
export function StepTable({ section, mayAsk, progressOf }: StepTableProps): ReactNode {
  const heads = [
    'Step',
    'What is done',
    progressOf ? 'My build' : false,
    mayAsk && { unseen: 'Ask' },
  ] as const;
  return (
    <FactTable name="Steps" heads={heads}>
      {section.steps.map((step) => (
        <tr key={step.id}>
          <td>
            <CallOut>{step.code}</CallOut>
          </td>
          <td>
            {step.title}
            <StepNotes step={step} />
          </td>
          {progressOf && <td>{progressOf(step)}</td>}
          {mayAsk && (
            <td>
              <SomethingWrong
                place={{ sectionId: section.id, stepId: step.id }}
                about={`step ${step.number}`}
              />
            </td>
          )}
        </tr>
      ))}
    </FactTable>
  );
}

function StepNotes({ step }: { readonly step: Step }): ReactNode {
  const { twoPerson, closesStructure, hazard } = step;
  const notes = [twoPerson && 'two people', closesStructure && 'closes the structure'].filter(Boolean);
  if (notes.length === 0 && !hazard) return null;
  return (
    <div className="muted">
      {notes.join(' · ')}
      {hazard && (
        <span className={classes['hazard']}>
          {notes.length > 0 ? ' · ' : ''}
          Hazard: {hazard}
        </span>
      )}
    </div>
  );
}
