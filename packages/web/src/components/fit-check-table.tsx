import {
  foremostRemedy,
  remedyHeadline,
  remedyName,
  VERDICT_WORDS,
  type FitCheck,
  type RemedyCheck,
  type RemedyKind,
  type Units,
} from '@rivetside/shared';
import { useId, useState, type ReactNode } from 'react';
import { FIGURE_HEADS, figuresOf, type Figure } from './fit-check-figures';
import { CheckLines } from './fit-check-lines';
import { CheckNotes, StopNotes } from './fit-check-notes';
import classes from './fit-check-table.module.css';
import { Verdict } from './verdict';

type Opened = { readonly kind: RemedyKind; readonly key: Figure['key'] | 'result' } | null;
const HEADS = ['Remedy', ...Object.values(FIGURE_HEADS), 'Result'];
const COMPACT_HEADS = ['Remedy', 'Result'];

interface RowProps {
  readonly remedy: RemedyCheck;
  readonly units: Units;
  readonly isForemost: boolean;
  readonly isCompact: boolean;
  readonly opened: Opened;
  readonly onOpen: (opened: Opened) => void;
}

function Row({ remedy, units, isForemost, isCompact, opened, onOpen }: RowProps): ReactNode {
  const id = useId();
  const { kind, verdict } = remedy;
  const headline = remedyHeadline(remedy, units);
  const name = remedyName(remedy);
  const figures = isCompact ? [] : figuresOf(remedy, units);
  const openKey = opened?.kind === kind ? opened.key : null;
  const lines = openKey === 'result' ? remedy.checks : figures.find(({ key }) => key === openKey)?.lines;
  const disclosure = (key: Figure['key'] | 'result') => ({
    type: 'button' as const,
    'aria-expanded': openKey === key,
    'aria-controls': openKey === key ? id : undefined,
    onClick: () => onOpen(openKey === key ? null : { kind, key }),
  });
  return (
    <>
      <tr role="row" className={isForemost ? classes['foremost'] : undefined}>
        <th role="rowheader" scope="row">
          {name}
        </th>
        {figures.map((figure) => (
          <td
            key={figure.key}
            role="cell"
            className={`${classes['figure']} ${figure.isTooClose ? classes['hatched'] : ''}`}
            data-figure={figure.key}
          >
            {figure.lines.length > 0 ? (
              <button
                {...disclosure(figure.key)}
                aria-label={`${FIGURE_HEADS[figure.key]} ${figure.text}, ${name}`}
              >
                {figure.text}
              </button>
            ) : (
              <span>{figure.text}</span>
            )}
          </td>
        ))}
        <td role="cell" className={classes['result']}>
          <button {...disclosure('result')} disabled={remedy.checks.length === 0}>
            <Verdict verdict={verdict}>{headline.text}</Verdict>
            {headline.text !== VERDICT_WORDS[verdict] && (
              <span className={classes['verdictWord']}>{VERDICT_WORDS[verdict]}</span>
            )}
          </button>
        </td>
      </tr>
      {lines && (
        <tr role="row" className={classes['detail']}>
          <td role="cell" id={id} colSpan={figures.length + 2}>
            <CheckLines lines={lines} units={units} />
            {openKey === 'result' && remedy.remarks.map((remark) => <p key={remark}>{remark}</p>)}
          </td>
        </tr>
      )}
    </>
  );
}

interface FitCheckTableProps {
  readonly check: FitCheck;
  readonly units: Units;
  /** One line a remedy: its figures are behind what decides it. */
  readonly compact?: boolean;
}

/** Every remedy with its figures and what decides it. Each figure opens its formula, limit, margin and source. */
export function FitCheckTable({ check, units, compact = false }: FitCheckTableProps): ReactNode {
  const [opened, setOpened] = useState<Opened>(null);
  const foremost = foremostRemedy(check);
  return (
    <div className={classes['box']}>
      <StopNotes codes={check.stopAndAsk} />
      <table role="table" className={classes['table']} aria-label="Fit check, remedy by remedy">
        <thead role="rowgroup">
          <tr role="row">
            {(compact ? COMPACT_HEADS : HEADS).map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {check.remedies.map((remedy) => (
            <Row
              key={remedy.kind}
              remedy={remedy}
              units={units}
              isForemost={remedy === foremost}
              isCompact={compact}
              opened={opened}
              onOpen={setOpened}
            />
          ))}
        </tbody>
      </table>
      <CheckNotes
        assumptions={check.assumptions}
        missing={check.missing}
        opener={compact ? 'result' : 'figure'}
      />
    </div>
  );
}
