import { formatLength, type HoleLine, type Section } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { useUnits } from '../../lib/units';
import { SomethingWrong } from './something-wrong';
import classes from './kits.module.css';

/** Rows of holes through a stack, with the kit maker's own limits where they are given. */
export function HoleLineTable({
  section,
  mayAsk,
}: {
  readonly section: Section;
  readonly mayAsk: boolean;
}): ReactNode {
  const units = useUnits();
  const length = (inches: number) => formatLength(inches, units);
  return (
    <div className={classes['scroll']} role="region" aria-label="Hole lines" tabIndex={0}>
      <table className={classes['table']}>
        <thead>
          <tr>
            <th>Hole line</th>
            <th>Through</th>
            <th>Rivet</th>
            <th className={classes['wide']}>Drill</th>
            <th className={`${classes['right']} ${classes['wide']}`}>Pitch</th>
            <th className={`${classes['right']} ${classes['wide']}`}>Edge</th>
            <th className={classes['right']}>Holes</th>
            {mayAsk && (
              <th>
                <span className="unseen">Ask</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {section.holeLines.map((line) => (
            <tr key={line.id}>
              <td>
                <CallOut>{line.code}</CallOut>
                <div className="muted">{line.title}</div>
                <Limits line={line} />
              </td>
              <td className={classes['num']}>{stackOf(line, length)}</td>
              <td>
                <CallOut>{line.callOut}</CallOut>
              </td>
              <td className={`${classes['num']} ${classes['wide']}`}>
                {line.drill} · {length(line.holeDiameter)}
              </td>
              <td className={`${classes['num']} ${classes['right']} ${classes['wide']}`}>
                {line.pitch === null ? '' : length(line.pitch)}
              </td>
              <td className={`${classes['num']} ${classes['right']} ${classes['wide']}`}>
                {line.edge === null ? '' : length(line.edge)}
              </td>
              <td className={`${classes['num']} ${classes['right']}`}>
                {line.count}
                {line.repeats > 1 ? ` × ${line.repeats}` : ''}
                {line.questionCount > 0 && (
                  <div>
                    <Link to={`/questions?holeLineId=${line.id}`}>{line.questionCount} asked</Link>
                  </div>
                )}
              </td>
              {mayAsk && (
                <td>
                  <SomethingWrong place={{ sectionId: section.id, holeLineId: line.id }} about={line.code} />
                </td>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function stackOf({ stack }: HoleLine, length: (inches: number) => string): string {
  return stack
    .map(({ number, thickness }) => `${number} ${thickness === null ? '' : length(thickness)}`.trim())
    .join(' + ');
}

function Limits({ line: { limits } }: { readonly line: HoleLine }): ReactNode {
  if (!limits) return null;
  const said = [
    limits.edgeMinimumD !== null && `edge ${limits.edgeMinimumD} D`,
    limits.pitchMinimumD !== null && `pitch ${limits.pitchMinimumD} D`,
  ].filter(Boolean);
  if (said.length === 0) return null;
  return (
    <div className="muted">
      at least {said.join(', ')} ({limits.source})
    </div>
  );
}
