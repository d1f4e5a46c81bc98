import { formatLengthUnit, MEASURING_TOOLS, type MeasuringTool } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { useUnits } from '../../lib/units';
import { Across, Apart, Edge, Pitch, Stack } from './drawings';
import classes from './stop.module.css';

interface Measure {
  readonly what: string;
  readonly how: string;
  readonly tools: readonly MeasuringTool[];
  readonly drawing: ReactNode;
}

const MEASURES: readonly Measure[] = [
  {
    what: 'The hole across, at its widest and its narrowest',
    how: 'In each sheet by itself, burr off. Note the drill that fits and the next that does not.',
    tools: ['pins', 'caliper'],
    drawing: <Across />,
  },
  {
    what: 'How far the holes of two sheets lie apart',
    how: 'Pin the neighbours so that the sheets lie as they will, then measure centre to centre, and say which way.',
    tools: ['pins', 'caliper'],
    drawing: <Apart />,
  },
  {
    what: 'From the hole to the nearest edge of each sheet',
    how: 'To the centre. Where only the rim can be reached, measure to the rim and say so: half the hole is added.',
    tools: ['caliper', 'rule'],
    drawing: <Edge />,
  },
  {
    what: 'To the neighbours on both sides',
    how: 'Centre to centre, and the size of each. Look for a bend near by and measure to where it begins.',
    tools: ['caliper', 'rule'],
    drawing: <Pitch />,
  },
  {
    what: 'Each sheet of the stack',
    how: 'Thickness, alloy, part number, in the order they lie. Primer counts: measure where it is bare.',
    tools: ['caliper'],
    drawing: <Stack />,
  },
];

/** What to measure, how, and how far each tool can be trusted. */
export function Measures(): ReactNode {
  const units = useUnits();
  const nameOf = (tool: MeasuringTool): string => {
    const found = MEASURING_TOOLS.find((one) => one.tool === tool)!;
    return `${found.name}, ± ${formatLengthUnit(found.error, units)}`;
  };
  return (
    <ol className={classes['measures']}>
      {MEASURES.map(({ what, how, tools, drawing }) => (
        <li key={what}>
          {drawing}
          <div>
            <h3>{what}</h3>
            <p>{how}</p>
            <ul className={classes['tools']}>
              {tools.map((tool) => (
                <li key={tool}>{nameOf(tool)}</li>
              ))}
            </ul>
          </div>
        </li>
      ))}
    </ol>
  );
}
