import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { KitDrawing } from './kit-drawing';
import classes from './welcome.module.css';

const OPERATIONS = [
  {
    word: 'Stop',
    text: 'A hole is off, a rivet is bad, a part does not fit. Before anything is drilled: what to measure, with what, and which photo.',
    caution: 'Reads without a network.',
  },
  {
    word: 'Ask',
    text: 'Pin the question to its place on the kit: section, part, hole line, hole. Type what you measured and see the drawing move, with every remedy checked against published practice.',
    caution: 'Each figure opens its formula, its source and its limit.',
  },
  {
    word: 'Talk it over',
    text: 'Builders and mentors of your chapter are at the sheet with you. A fix is written as operations, and another mentor stamps it: on what basis, for which holes, until when.',
    caution: 'A stamp can be held or withdrawn, never rewritten.',
  },
  {
    word: 'Carry out',
    text: 'Write down what was really drilled, measured and driven. It is checked once more and stands in the record of your build.',
    caution: 'What is put off comes back before the section is closed.',
  },
];

export function Welcome(): ReactNode {
  return (
    <div className={classes['page']}>
      <section className={classes['head']}>
        <div>
          <h1>The second pair of hands at the bench</h1>
          <p>
            Rivetside is for chapters of people who build all-metal kit aircraft at home: one place to ask,
            with numbers, before the next rivet goes in.
          </p>
          <div className={classes['doors']}>
            <Link to="/stop" className="btn">
              Something is wrong
            </Link>
            <Link to="/sign-in" className="btn plain">
              Sign in
            </Link>
            <Link to="/sign-up" className="btn plain">
              Make an account
            </Link>
          </div>
        </div>
        <KitDrawing />
      </section>
      <ol className={classes['operations']} aria-label="How a question goes">
        {OPERATIONS.map(({ word, text, caution }, at) => (
          <li key={word}>
            <b>Op {(at + 1) * 10}</b>
            <div>
              <h2>{word}</h2>
              <p>{text}</p>
              <small>{caution}</small>
            </div>
          </li>
        ))}
      </ol>
      <p className={classes['advice']}>
        Advice among builders. The kit maker’s instructions and local rules stand above it; where structure or
        safety is in doubt a licensed engineer or mechanic decides.
      </p>
    </div>
  );
}
