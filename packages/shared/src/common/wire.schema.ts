import { z } from 'zod';

/** Opaque id of anything on the wire. */
export const idSchema = z.uuid();
/** An instant, ISO 8601 in UTC. */
export const instantSchema = z.iso.datetime();
/** A calendar day, ISO 8601. */
export const daySchema = z.iso.date();

/** Somebody, as far as others may know: never more than id and name. */
export const personSchema = z.strictObject({ id: z.string(), name: z.string() }).meta({ id: 'Person' });
export type Person = z.infer<typeof personSchema>;

export const PAGE_MAX = 100;
export const PAGE_USUAL = 30;

/** `?limit=&cursor=`, shared by every list. Query values arrive as text. */
export const pageQueryShape = {
  limit: z.coerce.number().int().min(1).max(PAGE_MAX).optional(),
  cursor: z.string().min(1).max(500).optional(),
};
export const pageQuerySchema = z.strictObject(pageQueryShape);
export type PageAsked = z.infer<typeof pageQuerySchema>;

/** The answer of every list. */
export function pageOf<T extends z.ZodType>(item: T) {
  return z.strictObject({ items: z.array(item), nextCursor: z.string().nullable() });
}
export interface Page<T> {
  items: T[];
  nextCursor: string | null;
}

/** A reason that stays beside what it explains. */
export const reasonSchema = z
  .string()
  .trim()
  .min(3, 'Say why in a few words.')
  .max(2_000, 'Keep the reason under 2,000 characters.');
export const reasonBodySchema = z.strictObject({ reason: reasonSchema }).meta({ id: 'Reason' });
export type ReasonBody = z.infer<typeof reasonBodySchema>;
