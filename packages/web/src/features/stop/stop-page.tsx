import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CloseUp, ScaleIn, SquareOn, WholeRow } from './drawings';
import { Measures } from './measures';
import classes from './stop.module.css';

const PHOTOS = [
  {
    drawing: <ScaleIn />,
    what: 'A scale in the picture',
    how: 'A steel rule, flat on the same sheet, beside the hole.',
  },
  {
    drawing: <SquareOn />,
    what: 'Square on',
    how: 'The lens straight above, not from the side: a slant moves the edge.',
  },
  {
    drawing: <WholeRow />,
    what: 'The whole row',
    how: 'Far enough back to count the holes and see which one it is.',
  },
  {
    drawing: <CloseUp />,
    what: 'The hole from near',
    how: 'Both sheets in sight, sharp, light from one side.',
  },
] as const;

const CAUTIONS = [
  'Air hose off before sets, dies or bits are changed.',
  'Eyes and ears before the gun, the drill or the squeezer, for whoever stands by as well.',
  'Old primer may hold chromate: no dry sanding, gloves, mask.',
  'Deburr with a tool: a finger along a fresh edge is a cut.',
  'Tag the part and pin what is loose, so that nobody else drives the row.',
];

/** All words and drawings are in the page itself: there is no network in a hangar. */
export function StopPage({ search }: { readonly search: string }): ReactNode {
  return (
    <article className={classes['page']}>
      <header className={classes['head']}>
        <div>
          <h1>Do not drill yet</h1>
          <p>
            Leave it as it is for ten minutes. What it looks like now cannot be measured again once it is
            drilled.
          </p>
        </div>
        <span className={classes['word']} aria-hidden>
          STOP
        </span>
      </header>
      <ul className={classes['dont']}>
        <li>Do not open the hole “just to clean it up”.</li>
        <li>Do not drive a rivet to hold it. A skin pin will.</li>
        <li>Do not drill a rivet out in a temper. A poor rivet may be the lesser evil.</li>
      </ul>

      <section className={classes['card']} aria-labelledby="measure">
        <h2 id="measure">What to measure, and with what</h2>
        <Measures />
        <p className={classes['note']}>
          Write each number as you read it and name the tool: what it cannot tell apart is counted into the
          check. A photo can place a hole; it cannot settle an edge. Crack, fuel tank, control or spar: say so
          first.
        </p>
      </section>

      <div className={classes['two']}>
        <section className={classes['card']} aria-labelledby="photos">
          <h2 id="photos">Which photos</h2>
          <ul className={classes['photos']}>
            {PHOTOS.map(({ drawing, what, how }) => (
              <li key={what}>
                {drawing}
                <div>
                  <h3>{what}</h3>
                  <p>{how}</p>
                </div>
              </li>
            ))}
          </ul>
        </section>
        <section className={classes['card']} aria-labelledby="cautions">
          <h2 id="cautions">Meanwhile</h2>
          <ul className={classes['cautions']}>
            {CAUTIONS.map((caution) => (
              <li key={caution}>{caution}</li>
            ))}
          </ul>
        </section>
      </div>

      <footer className={classes['on']}>
        <Link to={`/ask${search}`} className="btn">
          Go on to ask
        </Link>
        <p>
          Nothing has to be complete: what is missing is asked for, and what you type is kept on this device.
          Advice among builders; the kit maker’s instructions and local rules stand above it, and where
          structure or safety is in doubt a licensed engineer or mechanic decides.
        </p>
      </footer>
    </article>
  );
}
