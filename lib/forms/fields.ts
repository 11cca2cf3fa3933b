import { z } from 'zod';

/** Fields that several forms share, with the limits they have everywhere. */
export const emailField = z
  .string('Enter an e-mail address')
  .trim()
  .min(1, 'Enter an e-mail address')
  .max(254, 'An e-mail address has at most 254 characters')
  .toLowerCase()
  .pipe(z.email('This is not an e-mail address, such as ines@millrace.example'));

export const currentPasswordField = z
  .string('Enter your password')
  .min(1, 'Enter your password')
  .max(200, 'A password has at most 200 characters');

export const newPasswordField = z
  .string('Choose a password')
  .min(12, 'A password needs at least 12 characters')
  .max(200, 'A password has at most 200 characters');

const CONTROL = /[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/u;

/** A text of one line, without control characters. */
export const lineField = (what: string, max: number) =>
  z
    .string(`Enter ${what}`)
    .trim()
    .min(1, `Enter ${what}`)
    .max(max, `At most ${max} characters`)
    .refine((text) => !CONTROL.test(text), 'Only a single line of plain text');

export const nameField = lineField('your name', 80);

/** Where to go after signing in: a path of this site, never another address. */
export const nextField = z
  .string()
  .max(2000)
  .optional()
  .transform((path) => (path && /^\/(?![/\\])[^\s\\]*$/.test(path) ? path : '/account'));

/** What a mailed link holds. */
export const tokenField = z
  .string('Open the link of the mail again')
  .max(200, 'Open the link of the mail again');

export const idField = z.string('Reload the page').min(1, 'Reload the page').max(100, 'Reload the page');

/** Roles beside `member`, which every member has. */
export const rolesField = z
  .array(z.enum(['host', 'librarian', 'admin'], 'There is no such role'))
  .max(3)
  .default([]);
