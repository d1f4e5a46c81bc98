import { z } from 'zod';
import { membershipSchema, siteRoleSchema } from '../access/roles.js';

export const PASSWORD_MIN = 12;
export const PASSWORD_MAX = 128;

export const emailSchema = z
  .string('Give an e-mail address.')
  .trim()
  .toLowerCase()
  .max(254, 'An e-mail address has at most 254 characters.')
  .pipe(z.email('This is not an e-mail address: it looks like name@place.example.'));

export const newPasswordSchema = z
  .string('Choose a password.')
  .min(PASSWORD_MIN, `A password has at least ${PASSWORD_MIN} characters.`)
  .max(PASSWORD_MAX, `A password has at most ${PASSWORD_MAX} characters.`);

/** What was typed to sign in: any text, so that the answer never tells what a password must look like. */
const givenPasswordSchema = z.string('Give your password.').min(1, 'Give your password.').max(1_000);

/** No line breaks or other control signs: a name goes into the head of mails. */
export const nameSchema = z
  .string('Give your name.')
  .trim()
  .min(2, 'Give your name as others know you.')
  .max(80, 'Keep the name under 80 characters.')
  .regex(/^[^\p{Cc}\p{Zl}\p{Zp}<>]*$/u, 'A name has no line breaks or angle brackets.')
  // It is read by others in mails and lists: nobody gets to put an advertisement there.
  .refine((name) => !/:\/\/|www\./i.test(name), 'A name has no web address in it.');

export const signUpSchema = z
  .strictObject({ email: emailSchema, password: newPasswordSchema, name: nameSchema })
  .meta({ id: 'SignUp' });
export type SignUp = z.infer<typeof signUpSchema>;

const tokenSchema = z
  .string('The link is not whole.')
  .min(20, 'The link is not whole.')
  .max(200, 'The link is not whole.');
export const confirmEmailSchema = z.strictObject({ token: tokenSchema }).meta({ id: 'ConfirmEmail' });
export type ConfirmEmail = z.infer<typeof confirmEmailSchema>;

export const signInSchema = z
  .strictObject({ email: emailSchema, password: givenPasswordSchema })
  .meta({ id: 'SignIn' });
export type SignIn = z.infer<typeof signInSchema>;

export const forgotPasswordSchema = z.strictObject({ email: emailSchema }).meta({ id: 'ForgotPassword' });
export type ForgotPassword = z.infer<typeof forgotPasswordSchema>;

export const resetPasswordSchema = z
  .strictObject({ token: tokenSchema, password: newPasswordSchema })
  .meta({ id: 'ResetPassword' });
export type ResetPassword = z.infer<typeof resetPasswordSchema>;

export const unitsSchema = z.enum(['inch', 'mm']);

const zoneSchema = z
  .string()
  .max(60)
  .refine((zone) => {
    try {
      new Intl.DateTimeFormat('en', { timeZone: zone });
      return true;
    } catch {
      return false;
    }
  }, 'This is not a time zone, such as Europe/London.');

export const changeMeSchema = z
  .strictObject({ name: nameSchema.optional(), units: unitsSchema.optional(), zone: zoneSchema.optional() })
  .meta({ id: 'ChangeMe' });
export type ChangeMe = z.infer<typeof changeMeSchema>;

export const changePasswordSchema = z
  .strictObject({ password: givenPasswordSchema, newPassword: newPasswordSchema })
  .meta({ id: 'ChangePassword' });
export type ChangePassword = z.infer<typeof changePasswordSchema>;

export const changeEmailSchema = z
  .strictObject({ password: givenPasswordSchema, email: emailSchema })
  .meta({ id: 'ChangeEmail' });
export type ChangeEmail = z.infer<typeof changeEmailSchema>;

export const meSchema = z
  .strictObject({
    id: z.string(),
    name: z.string(),
    email: z.string(),
    units: unitsSchema,
    zone: z.string(),
    memberships: z.array(membershipSchema),
    siteRole: siteRoleSchema,
  })
  .meta({ id: 'Me' });
export type Me = z.infer<typeof meSchema>;

export const signedInSchema = z
  .strictObject({
    accessToken: z.string(),
    /** seconds */
    expiresIn: z.number().int(),
    user: meSchema,
  })
  .meta({ id: 'SignedIn' });
export type SignedIn = z.infer<typeof signedInSchema>;

export const sessionSchema = z
  .strictObject({
    id: z.string(),
    createdAt: z.string(),
    lastUsedAt: z.string(),
    device: z.string(),
    current: z.boolean(),
  })
  .meta({ id: 'Session' });
export type Session = z.infer<typeof sessionSchema>;

/** The same answer whether or not the address exists. */
export const mailSentSchema = z.strictObject({ message: z.string() }).meta({ id: 'MailSent' });
export type MailSent = z.infer<typeof mailSentSchema>;

export const demoSignInSchema = z
  .strictObject({ email: z.string(), name: z.string(), as: z.string() })
  .meta({ id: 'DemoSignIn' });
export type DemoSignIn = z.infer<typeof demoSignInSchema>;
