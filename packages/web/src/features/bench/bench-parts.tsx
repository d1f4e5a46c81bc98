import type { ReactNode } from 'react';
import classes from './bench.module.css';

/** What a person of several roles sees stands one below the other: what is in hand first. */
export function BenchPage({ children }: { readonly children: ReactNode }): ReactNode {
  return <div className={classes['page']}>{children}</div>;
}

interface TwoColumnsProps {
  readonly left: ReactNode;
  readonly right: ReactNode;
}

export function TwoColumns({ left, right }: TwoColumnsProps): ReactNode {
  return (
    <div className={classes['two']}>
      <div className={classes['column']}>{left}</div>
      <div className={classes['column']}>{right}</div>
    </div>
  );
}

/** Of two builds of one kit the reader's own: steps are marked on one of them. */
export function onePerKit<B extends { kitId: string; owner: { id: string } }>(
  builds: readonly B[],
  meId: string,
): B[] {
  const own = builds.filter(({ owner }) => owner.id === meId);
  const others = builds.filter(({ owner }) => owner.id !== meId);
  return [...own, ...others].filter(
    (one, at, all) => all.findIndex(({ kitId }) => kitId === one.kitId) === at,
  );
}

/** Every step of every section is driven. */
export function AllDriven({ kitName }: { readonly kitName: string }): ReactNode {
  return (
    <section className={classes['done']}>
      <h2>Every step of {kitName} is driven.</h2>
      <p>What is still open stands in your record.</p>
    </section>
  );
}
