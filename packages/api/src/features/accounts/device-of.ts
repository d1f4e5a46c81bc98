import Bowser from 'bowser';

/** `Chromium on Linux`, so that a person recognises their own. */
export function deviceOf(userAgent: string | undefined): string {
  if (!userAgent) return 'unknown device';
  const { browser, os } = Bowser.parse(userAgent.slice(0, 500));
  const parts = [browser.name, os.name].filter((part) => part !== undefined && part !== '');
  return parts.length === 0 ? 'unknown device' : parts.join(' on ');
}
