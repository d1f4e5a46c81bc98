import type { Settings } from '../config/settings.js';

interface From {
  readonly origin?: string | undefined;
  readonly host?: string | undefined;
}

/** Browsers send Origin with a socket; what sends none is no browser, and the token still decides. */
export function isOurPage(
  { origin, host }: From,
  { publicUrl, production }: Pick<Settings, 'publicUrl' | 'production'>,
): boolean {
  if (origin === undefined || origin === publicUrl) return true;
  // While developing the page is also opened by other names of the same machine.
  return !production && origin.replace(/^https?:\/\//, '') === host;
}
