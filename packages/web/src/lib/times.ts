import { useMemo } from 'react';
import { useMe } from './session';

const DAY_ONLY = /^\d{4}-\d\d-\d\d$/;
const MINUTE = 60_000;
const STEPS = [
  { unit: 'year', ms: 365 * 24 * 60 * MINUTE },
  { unit: 'month', ms: 30 * 24 * 60 * MINUTE },
  { unit: 'week', ms: 7 * 24 * 60 * MINUTE },
  { unit: 'day', ms: 24 * 60 * MINUTE },
  { unit: 'hour', ms: 60 * MINUTE },
  { unit: 'minute', ms: MINUTE },
] as const;

export interface Times {
  /** "12 May 25" */
  date(iso: string): string;
  /** "07:15" */
  time(iso: string): string;
  /** "12 May 25, 07:15" */
  dateTime(iso: string): string;
  /** How long ago, in words: "3 days" */
  since(iso: string, now?: Date): string;
}

/** An unknown zone, as from an account made elsewhere, falls back to the device's own. */
function formatter(options: Intl.DateTimeFormatOptions, timeZone: string | undefined): Intl.DateTimeFormat {
  try {
    return new Intl.DateTimeFormat('en-GB', { ...options, timeZone });
  } catch {
    return new Intl.DateTimeFormat('en-GB', options);
  }
}

export function timesIn(zone: string | undefined): Times {
  const dayForm = { day: 'numeric', month: 'short', year: '2-digit' } as const;
  const day = formatter(dayForm, zone);
  // A calendar day has no hour to shift it into the day before.
  const plainDay = formatter(dayForm, 'UTC');
  const clock = formatter({ hour: '2-digit', minute: '2-digit', hourCycle: 'h23' }, zone);
  const date = (iso: string) => (DAY_ONLY.test(iso) ? plainDay : day).format(new Date(iso));
  const time = (iso: string) => clock.format(new Date(iso));
  return {
    date,
    time,
    dateTime: (iso) => `${date(iso)}, ${time(iso)}`,
    since: (iso, now = new Date()) => inWords(now.getTime() - new Date(iso).getTime()),
  };
}

function inWords(ms: number): string {
  const step = STEPS.find((one) => ms >= one.ms);
  if (!step) return 'a moment';
  const count = Math.floor(ms / step.ms);
  return `${count} ${step.unit}${count === 1 ? '' : 's'}`;
}

export function useTimes(): Times {
  const zone = useMe()?.zone;
  return useMemo(() => timesIn(zone), [zone]);
}
