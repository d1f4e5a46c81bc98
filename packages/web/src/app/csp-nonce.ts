/** The one number that lets a style element of ours through the page's policy; new with every page view. */
export function cspNonce(): string {
  return document.querySelector<HTMLMetaElement>('meta[name="csp-nonce"]')?.content ?? '';
}
