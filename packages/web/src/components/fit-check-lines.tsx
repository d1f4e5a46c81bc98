import { VERDICT_WORDS, type CheckLine, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { inUnit, marginWords, reasonWords, sourceTitles } from './fit-check-figures';
import classes from './fit-check-table.module.css';
import { Verdict } from './verdict';

function Fact({ name, children }: { name: string; children: ReactNode }): ReactNode {
  return (
    <div>
      <dt>{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

/** Everything behind a figure: value, limit, margin, the sum itself and where the limit stands. */
export function CheckLines({ lines, units }: { lines: readonly CheckLine[]; units: Units }): ReactNode {
  if (lines.length === 0) return <p className={classes['none']}>Nothing to check here.</p>;
  return (
    <ul className={classes['lines']}>
      {lines.map((line) => {
        const margin = marginWords(line, units);
        const reason = reasonWords(line);
        return (
          <li key={line.id}>
            <div className={classes['lineHead']}>
              <b>{line.label}</b>
              <Verdict verdict={line.verdict}>{VERDICT_WORDS[line.verdict]}</Verdict>
            </div>
            {reason && <p className={classes['reason']}>{reason}</p>}
            <dl>
              <Fact name="Value">{line.value === null ? 'not known' : inUnit(line.value, line, units)}</Fact>
              {line.limit !== null && <Fact name="Limit">{inUnit(line.limit, line, units)}</Fact>}
              {margin && <Fact name="Margin">{margin}</Fact>}
              <Fact name="Formula">
                <span className={classes['formula']}>{line.formula}</span>
              </Fact>
              <Fact name="Source">
                <ul className={classes['sources']}>
                  {sourceTitles(line.source).map((title) => (
                    <li key={title}>{title}</li>
                  ))}
                </ul>
              </Fact>
            </dl>
          </li>
        );
      })}
    </ul>
  );
}
