import { z } from 'zod';

/** Beyond this a length on a hole card is a slip of the decimal point or of the unit. Inch. */
const LONGEST = 100;

/** A length in inches, or the length with its measuring error `u`. */
export type Measured = number | { readonly value: number; readonly u?: number | null | undefined };

/** False for what the card leaves out, be it absent or null. */
export function known<T>(value: T | null | undefined): value is T {
  return value !== null && value !== undefined;
}

/** The length itself, inch. */
export function valueOf(measured: Measured): number {
  return typeof measured === 'number' ? measured : measured.value;
}

/** Its measuring error, inch; none given counts as zero. */
export function errorOf(measured: Measured): number {
  return typeof measured === 'number' ? 0 : (measured.u ?? 0);
}

/** A length as it is said in a message: no trailing noughts, no more than five decimals, which 5/32 needs. */
export function said(value: number): string {
  return String(Math.round(value * 1e5) / 1e5);
}

interface MeasuredRules {
  /** The trade word that opens the message. */
  readonly what: string;
  readonly signed?: boolean;
  readonly zero?: boolean;
  readonly longest?: number;
}

function complaint(value: number, { what, signed = false, zero = false, longest = LONGEST }: MeasuredRules) {
  if (!signed && value < 0) return `${what} ${said(value)} is less than nothing.`;
  if (!signed && !zero && value === 0) return `${what} 0 cannot be: leave it out where it was not measured.`;
  if (Math.abs(value) > longest) {
    return `${what} ${said(value)} in cannot be: is it in millimetres? Type mm after it.`;
  }
  return null;
}

/** Schema of a measured length in the words of the trade: `measured({ what: 'edge' })`. */
export function measured(rules: MeasuredRules) {
  const u = z
    .number('Give the measuring error in inches, such as 0.005.')
    .min(0, 'A measuring error is not less than nothing.')
    .max(LONGEST, 'A measuring error as large as that settles nothing.')
    .nullish();
  return z
    .union(
      [z.number(), z.strictObject({ value: z.number(), u })],
      `Give the ${rules.what} as a number in inches, or with its measuring error.`,
    )
    .superRefine((length, context) => {
      const message = complaint(valueOf(length), rules);
      const path = typeof length === 'number' ? [] : ['value'];
      if (message) context.addIssue({ code: 'custom', message, path });
    });
}
