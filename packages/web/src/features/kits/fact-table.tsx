import type { ReactNode } from 'react';
import classes from './kits.module.css';

interface FactTableProps {
  readonly name: string;
  /** Of the columns, left to right; those of numbers stand at the right. */
  readonly heads: readonly (string | { readonly right: string } | { readonly unseen: string } | false)[];
  readonly children: ReactNode;
}

/** A table on a wide page; on a phone each row is a card, its cells named by their `data-label`. */
export function FactTable({ name, heads, children }: FactTableProps): ReactNode {
  return (
    <div className={classes['scroll']} role="region" aria-label={name} tabIndex={0}>
      <table className={classes['table']} aria-label={name}>
        <thead>
          <tr>
            {heads.map((head) => {
              if (head === false) return null;
              if (typeof head === 'string') return <th key={head}>{head}</th>;
              if ('right' in head)
                return (
                  <th key={head.right} className={classes['right']}>
                    {head.right}
                  </th>
                );
              return (
                <th key={head.unseen}>
                  <span className="unseen">{head.unseen}</span>
                </th>
              );
            })}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </div>
  );
}

/** A number in its column. */
export function NumberCell({
  label,
  children,
}: {
  readonly label: string;
  readonly children: ReactNode;
}): ReactNode {
  return (
    <td data-label={label} className={`${classes['num']} ${classes['right']}`}>
      <div>{children}</div>
    </td>
  );
}
