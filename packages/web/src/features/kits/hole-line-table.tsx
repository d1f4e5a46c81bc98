import { formatLength, type HoleLine, type Section, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { useUnits } from '../../lib/units';
import { FactTable, NumberCell } from './fact-table';
import classes from './kits.module.css';
import { limitWords } from './limit-words';
import { SomethingWrong } from './something-wrong';

interface HoleLineTableProps {
  readonly section: Section;
  readonly mayAsk: boolean;
}

/** Rows of holes through a stack, with the kit maker's own limits where they are given. */
export function HoleLineTable({ section, mayAsk }: HoleLineTableProps): ReactNode {
  const units = useUnits();
  const numbers = [{ right: 'Pitch' }, { right: 'Edge' }, { right: 'Holes' }];
  const heads = ['Hole line', 'Through', 'Rivet', 'Drill', ...numbers, mayAsk && { unseen: 'Ask' }];
  return (
    <FactTable name="Hole lines" heads={heads}>
      {section.holeLines.map((line) => (
        <tr key={line.id}>
          <td className={classes['first']}>
            <CallOut>{line.code}</CallOut>
            <div className="muted">
              {line.title}, {line.revision}
            </div>
            <Limits line={line} units={units} />
          </td>
          <td data-label="Through" className={classes['num']}>
            <Stack line={line} units={units} />
          </td>
          <td data-label="Rivet">
            <CallOut>{line.callOut}</CallOut>
          </td>
          <td data-label="Drill" className={classes['num']}>
            {line.drill} · {formatLength(line.holeDiameter, units)}
          </td>
          <NumberCell label="Pitch">{orNotGiven(line.pitch, units)}</NumberCell>
          <NumberCell label="Edge">{orNotGiven(line.edge, units)}</NumberCell>
          <NumberCell label="Holes">
            {line.count}
            {line.repeats > 1 ? ` × ${line.repeats}` : ''}
            {line.questionCount > 0 && (
              <Link className={classes['asked']} to={`/questions?holeLineId=${line.id}`}>
                {line.questionCount} asked<span className="unseen"> at {line.code}</span>
              </Link>
            )}
          </NumberCell>
          {mayAsk && (
            <td>
              <SomethingWrong place={{ sectionId: section.id, holeLineId: line.id }} about={line.code} />
            </td>
          )}
        </tr>
      ))}
    </FactTable>
  );
}

function orNotGiven(inches: number | null, units: Units): ReactNode {
  return inches === null ? <span className="muted">not given</span> : formatLength(inches, units);
}

/** Layer by layer, the outermost first. */
function Stack({ line, units }: { readonly line: HoleLine; readonly units: Units }): ReactNode {
  return (
    <span className={classes['stack']}>
      {line.stack.map(({ partId, number, thickness }) => (
        <span key={partId}>
          {number} {thickness === null ? '' : formatLength(thickness, units)}
        </span>
      ))}
    </span>
  );
}

function Limits({ line, units }: { readonly line: HoleLine; readonly units: Units }): ReactNode {
  const words = line.limits ? limitWords(line.limits, units) : '';
  if (!words) return null;
  return (
    <div className={classes['limits']}>
      Kit maker: {words} <span className="muted">({line.limits!.source})</span>
    </div>
  );
}
