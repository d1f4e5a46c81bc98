/** A page of this site and no other: a link in a mail must not lead anybody away after the sign-in. */
export function pageWanted(next: string | null): string {
  return next && /^\/(?![/\\])/.test(next) ? next : '/bench';
}
