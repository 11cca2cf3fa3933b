import 'server-only';
import type { Letter } from './templates/letter';

export interface LetterSpec extends Letter {
  readonly kind: string;
  readonly subject: string;
}

const NOT_YOU = 'If you did not ask for this, do nothing: nothing changes.';
const NOT_YOU_CHANGED =
  'If this was not you, set a new password at once and tell who runs your club’s Bendwell.';

export const invitation = (inviter: string, club: string, href: string, days: number): LetterSpec => ({
  kind: 'invitation',
  subject: `${inviter} invites you to ${club}`,
  heading: `Come and design with ${club}`,
  paragraphs: [
    `${inviter} has opened a place for you in the Bendwell of ${club}, where members design parts that bend and do not break.`,
    'Choose a name and a password, and you are in.',
  ],
  link: { href, label: 'Accept the invitation' },
  footing: `The link works once, for ${days} days. If you do not know the club, do nothing.`,
});

export const resetPassword = (href: string, minutes: number): LetterSpec => ({
  kind: 'reset-password',
  subject: 'Set a new password',
  heading: 'Set a new password',
  paragraphs: ['Somebody, we hope you, has forgotten the password of your account. Choose a new one here.'],
  link: { href, label: 'Choose a new password' },
  footing: `The link works once, for ${minutes} minutes. ${NOT_YOU}`,
});

export const verifyEmail = (href: string, hours: number): LetterSpec => ({
  kind: 'verify-email',
  subject: 'Confirm your e-mail address',
  heading: 'Is this your address?',
  paragraphs: ['Confirm that mail to this address reaches you.'],
  link: { href, label: 'Confirm this address' },
  footing: `The link works once, for ${hours} hours. ${NOT_YOU}`,
});

export const addressTaken = (): LetterSpec => ({
  kind: 'address-taken',
  subject: 'This address already has an account',
  heading: 'This address already has an account',
  paragraphs: [
    'A member asked to use this address for another account. An address belongs to one account only, so nothing was changed.',
  ],
  footing: 'If you did not ask for this, do nothing.',
});

export const passwordChanged = (): LetterSpec => ({
  kind: 'password-changed',
  subject: 'Your password was changed',
  heading: 'Your password was changed',
  paragraphs: ['The password of your account was changed, and every other sign-in was ended.'],
  footing: NOT_YOU_CHANGED,
});

export const emailChanged = (now: string): LetterSpec => ({
  kind: 'email-changed',
  subject: 'Your e-mail address was changed',
  heading: 'Your e-mail address was changed',
  paragraphs: [`Your account now goes by the address ${now}. This address is no longer used.`],
  footing: NOT_YOU_CHANGED,
});
