import type { Units } from '@rivetside/shared';
import { memo } from 'react';
import { FitCheckTable } from '../../components/fit-check-table';
import { HoleDrawing } from '../../components/hole-drawing';
import type { HoleCardFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { moveField } from './move-field';
import type { HoleCardAtHand } from './use-hole-card';

interface DrawnProps {
  readonly hole: HoleCardAtHand;
  readonly units: Units;
  /** Has to stay the same function, else every keystroke draws it all again. */
  readonly onChange: (fields: HoleCardFields) => void;
}

const BEHIND = 'As last understood: a field of the hole card is not.';

/** The card drawn beside its form; a point that is moved on it writes its field. */
export const HoleCardDrawn = memo(function HoleCardDrawn({ hole, units, onChange }: DrawnProps) {
  const { fields, card, check, reading, isBehind } = hole;
  if (!card) return <p className={classes['quiet']}>Drawn as soon as the rivet is given.</p>;
  return (
    <>
      {isBehind && <p className={classes['quiet']}>{BEHIND}</p>}
      <HoleDrawing
        card={card}
        check={check}
        units={units}
        onChange={(moved, handle) =>
          onChange(moveField(fields, { handle, card: moved, fieldOf: reading.fieldOf }, units))
        }
      />
    </>
  );
});

/** Every remedy checked beside the form. */
export const HoleCardChecked = memo(function HoleCardChecked({
  hole,
  units,
}: Pick<DrawnProps, 'hole' | 'units'>) {
  if (!hole.check) return <p className={classes['quiet']}>Checked as soon as the rivet is given.</p>;
  return (
    <>
      {hole.isBehind && <p className={classes['quiet']}>{BEHIND}</p>}
      <FitCheckTable check={hole.check} units={units} compact />
    </>
  );
});
