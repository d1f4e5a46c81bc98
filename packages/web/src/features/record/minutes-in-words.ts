const HOUR = 60;

/** "18 minutes", "2 hours", "1 hour 5 minutes". */
export function minutesInWords(minutes: number): string {
  const hours = Math.floor(minutes / HOUR);
  const rest = minutes % HOUR;
  const parts = [hours > 0 && count(hours, 'hour'), (rest > 0 || hours === 0) && count(rest, 'minute')];
  return parts.filter(Boolean).join(' ');
}

function count(number: number, word: string): string {
  return `${number} ${word}${number === 1 ? '' : 's'}`;
}
