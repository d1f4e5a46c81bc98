/** How many items are open, beside the title of their card. */
export function openCount(count: number): string {
  if (count === 0) return 'none open';
  return count === 1 ? 'one open item' : `${count} open items`;
}
