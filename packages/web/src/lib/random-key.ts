/** A fresh Idempotency-Key. `crypto.randomUUID` is missing on a plain http address of a workshop's own network. */
export function randomKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
