import { formatLength, type Part, type Section } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { useUnits } from '../../lib/units';
import { SomethingWrong } from './something-wrong';
import classes from './kits.module.css';

/** The parts that a section is made of. */
export function PartTable({
  section,
  mayAsk,
}: {
  readonly section: Section;
  readonly mayAsk: boolean;
}): ReactNode {
  const units = useUnits();
  const length = (inches: number) => formatLength(inches, units);
  const { parts } = section;
  return (
    <div className={classes['scroll']} role="region" aria-label="Parts" tabIndex={0}>
      <table className={classes['table']}>
        <thead>
          <tr>
            <th>Part</th>
            <th>Name</th>
            <th className={classes['wide']}>Alloy</th>
            <th className={classes['right']}>Thick</th>
            <th className={`${classes['right']} ${classes['wide']}`}>Per kit</th>
            <th>Questions</th>
            {mayAsk && (
              <th>
                <span className="unseen">Ask</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {parts.map((part) => (
            <tr key={part.id}>
              <td>
                <CallOut>{part.number}</CallOut>
              </td>
              <td>{part.name}</td>
              <td className={classes['wide']}>{part.alloy}</td>
              <td className={`${classes['num']} ${classes['right']}`}>
                {part.thickness === null ? '' : length(part.thickness)}
              </td>
              <td className={`${classes['num']} ${classes['right']} ${classes['wide']}`}>{part.quantity}</td>
              <td>{questionsOf(part)}</td>
              {mayAsk && (
                <td>
                  <SomethingWrong place={{ sectionId: section.id, partId: part.id }} about={part.number} />
                </td>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function questionsOf({ id, questionCount, number }: Part): ReactNode {
  if (questionCount === 0) return <span className="muted">none</span>;
  return (
    <Link to={`/questions?partId=${id}`} aria-label={`${questionCount} questions about ${number}`}>
      {questionCount}
    </Link>
  );
}
