import { letter } from '../../common/mail/letter.js';
import type { Mail } from '../../common/mail/mail.js';

interface To {
  readonly email: string;
  readonly name: string;
}

/** Without the name: it goes to an address that anybody may have typed, with whatever they typed as a name. */
export const confirmLetter = ({ email }: To, url: string): Mail =>
  letter({
    to: email,
    subject: 'Confirm your address',
    greeting: 'Hello,',
    lines: [
      'Press once and your Rivetside account is open. The link works for two days.',
      'If you did not sign up, leave it.',
    ],
    action: { label: 'Confirm this address', url },
  });

export const haveAccountLetter = ({ email, name }: To, url: string): Mail =>
  letter({
    to: email,
    subject: 'You already have an account',
    greeting: `Hello ${name},`,
    lines: [
      'Somebody, perhaps you, wanted to sign up with this address. It has an account already, so nothing was changed.',
      'If you have forgotten the password, set a new one.',
    ],
    action: { label: 'Set a new password', url },
  });

export const resetLetter = ({ email, name }: To, url: string): Mail =>
  letter({
    to: email,
    subject: 'Set a new password',
    greeting: `Hello ${name},`,
    lines: [
      'The link works once, within an hour. Until you use it the old password stands.',
      'If you did not ask for it, leave it.',
    ],
    action: { label: 'Set a new password', url },
  });

export const changeEmailLetter = ({ email, name }: To, url: string): Mail =>
  letter({
    to: email,
    subject: 'Confirm your new address',
    greeting: `Hello ${name},`,
    lines: ['Press once and your account uses this address. The link works for two days.'],
    action: { label: 'Use this address', url },
  });

export const passwordChangedLetter = ({ email, name }: To, url: string): Mail =>
  letter({
    to: email,
    subject: 'Your password was changed',
    greeting: `Hello ${name},`,
    lines: [
      'Your password was changed and every other device was signed out.',
      'If that was not you, set a new password at once.',
    ],
    action: { label: 'Set a new password', url },
  });

export const emailChangedLetter = ({ email, name }: To): Mail =>
  letter({
    to: email,
    subject: 'Your account has a new address',
    greeting: `Hello ${name},`,
    lines: [
      'Your account uses another e-mail address now, and this one no longer.',
      'If that was not you, tell the admin of your chapter at once.',
    ],
  });
