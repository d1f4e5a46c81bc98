import { BOLT_TORQUES, THREADS, type ThreadRow } from '../../trade/threads.js';
import { requireNotNegative, requirePositive, requireRow } from './require.js';

/** Depth of a full unified thread is 0.6495 of its pitch on each side. */
const FULL_THREAD = 1.299;

/**
 * Recommended torque of a nut, inch-pound, with the measured run-on drag added (S36, S37): oil-free cadmium plate,
 * and only where the kit maker gives none. Throws RangeError naming `thread`, `nut` or `drag`.
 */
export function boltTorque({
  thread,
  nut,
  drag = 0,
}: {
  thread: string;
  nut: 'tension' | 'shear';
  drag?: number;
}) {
  requireNotNegative('drag', drag);
  const row = requireRow(
    'thread',
    thread,
    BOLT_TORQUES.rows.find((one) => one.thread === thread),
  );
  if (nut !== 'tension' && nut !== 'shear')
    throw new RangeError(`nut: ${String(nut)} is neither tension nor shear.`);
  const [minimum, maximum] = row[nut];
  return { minimum: minimum + drag, maximum: maximum + drag };
}

function threadRow(thread: string): ThreadRow {
  const row = THREADS.rows.find((one) => one.thread === thread);
  return requireRow('thread', thread, row);
}

/** Drill for about three quarters of a full thread, inch (S38). Throws RangeError naming `thread`. */
export function tapDrill({ thread }: { thread: string }) {
  const row = threadRow(thread);
  return { drill: row.tapDrill, diameter: row.tapDiameter };
}

/** Share of a full thread that a drilled hole leaves, percent: (major - drill) x threads per inch / 1.299. Throws RangeError naming the field. */
export function threadEngagement({ thread, drillDiameter }: { thread: string; drillDiameter: number }) {
  requirePositive('drillDiameter', drillDiameter);
  const { major } = threadRow(thread);
  const perInch = Number(thread.split('-').at(-1));
  return { percent: (100 * (major - drillDiameter) * perInch) / FULL_THREAD };
}
