import { formatLength, type Part, type Section } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { useUnits } from '../../lib/units';
import { FactTable, NumberCell } from './fact-table';
import { SomethingWrong } from './something-wrong';

const HANDS: Readonly<Record<string, string>> = { L: 'left', R: 'right', LR: 'left and right' };

interface PartTableProps {
  readonly section: Section;
  readonly mayAsk: boolean;
}

/** The parts that a section is made of. */
export function PartTable({ section, mayAsk }: PartTableProps): ReactNode {
  const units = useUnits();
  const heads = ['Part', 'Name', 'Alloy', { right: 'Thick' }, { right: 'Per kit' }, 'Questions'];
  return (
    <FactTable name="Parts" heads={[...heads, mayAsk && { unseen: 'Ask' }]}>
      {section.parts.map((part) => (
        <tr key={part.id}>
          <td>
            <CallOut>{part.number}</CallOut>
          </td>
          <td>
            {part.name}
            {part.hands && <span className="muted">, {HANDS[part.hands] ?? part.hands}</span>}
          </td>
          <td data-label="Alloy">{part.alloy}</td>
          <NumberCell label="Thick">
            {part.thickness === null ? <NotGiven /> : formatLength(part.thickness, units)}
          </NumberCell>
          <NumberCell label="Per kit">{part.quantity}</NumberCell>
          <td data-label="Questions">
            <QuestionsAbout part={part} />
          </td>
          {mayAsk && (
            <td>
              <SomethingWrong place={{ sectionId: section.id, partId: part.id }} about={part.number} />
            </td>
          )}
        </tr>
      ))}
    </FactTable>
  );
}

const NotGiven = () => <span className="muted">not given</span>;

function QuestionsAbout({ part: { id, questionCount, number } }: { readonly part: Part }): ReactNode {
  if (questionCount === 0) return <span className="muted">none</span>;
  const asked = questionCount === 1 ? 'question' : 'questions';
  return (
    <Link to={`/questions?partId=${id}`} aria-label={`${questionCount} ${asked} about ${number}`}>
      {questionCount}
    </Link>
  );
}
