import {
  errorOf,
  formatLength,
  formatWithError,
  type HoleCard,
  known,
  rivetCallOut,
  type Question,
  type Units,
  valueOf,
} from '@rivetside/shared';
import type { ReactNode } from 'react';
import { HoleDrawing } from '../../components/hole-drawing';
import { PageCard } from '../../components/page-card';
import { useUnits } from '../../lib/units';
import classes from './sheet.module.css';

/** The hole card drawn to scale, with the four numbers that one looks for first. */
export function HoleCardPanel({ sheet }: { readonly sheet: Question }): ReactNode {
  const units = useUnits();
  const { holeCard, fitCheck } = sheet;
  if (!holeCard) return null;
  return (
    <PageCard title="Hole card" aside="drawn to scale">
      <HoleDrawing card={holeCard} check={fitCheck} units={units} />
      <dl className={classes['facts']}>
        {factsOf(holeCard, units).map(({ name, value }) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </PageCard>
  );
}

function factsOf(card: HoleCard, units: Units): { name: string; value: string }[] {
  const stack = card.layers.map(({ thickness }) =>
    known(thickness) ? formatLength(valueOf(thickness), units) : '?',
  );
  const { head = null, alloy = null, dash } = card.rivet;
  return [
    { name: 'Stack', value: stack.join(' + ') },
    { name: 'Rivet', value: rivetCallOut({ head, alloy, dash, lengthDash: null }) },
    { name: 'Layers off by', value: offBy(card, units) },
    { name: `Edge, ${nearest(card)?.name ?? 'nearest'}`, value: nearest(card)?.say(units) ?? 'not measured' },
  ];
}

/** The largest distance of a layer's hole from that of the first. */
function offBy({ layers }: HoleCard, units: Units): string {
  const places = layers.flatMap(({ offset }) => (known(offset?.x) && known(offset?.y) ? [offset] : []));
  if (places.length < layers.length) return 'not measured';
  const far = places
    .map(({ x, y }) => ({ off: Math.hypot(valueOf(x!), valueOf(y!)), u: Math.max(errorOf(x!), errorOf(y!)) }))
    .reduce((most, one) => (one.off > most.off ? one : most));
  return formatWithError(far.off, far.u, units);
}

function nearest({ layers }: HoleCard) {
  const edges = layers.flatMap(({ name, edges: all }) =>
    (all ?? []).flatMap(({ distance }) => (known(distance) ? [{ name, distance }] : [])),
  );
  const [first] = edges.sort((one, other) => valueOf(one.distance!) - valueOf(other.distance!));
  if (!first) return null;
  const { name, distance } = first;
  return { name, say: (units: Units) => formatWithError(valueOf(distance!), errorOf(distance!), units) };
}
