import 'server-only';
import { render } from '@react-email/render';
import { createElement } from 'react';
import { InvalidInput } from '@/lib/errors';
import type { LetterSpec } from './letters';
import { LetterMail } from './templates/letter';

/** A mail ready to be sent. */
export interface Mail {
  readonly kind: string;
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

const BREAKS = /[\p{Cc}\p{Zl}\p{Zp}]/u;
const RECIPIENT = /^[^\s@,;:<>()[\]"\\]+@[^\s@,;:<>()[\]"\\]+$/;

/** What becomes a header must be one line, and the recipient one bare address: no header can be smuggled in. */
function headersOf(recipient: string, subject: string): { recipient: string; subject: string } {
  if (!RECIPIENT.test(recipient) || recipient.length > 254 || BREAKS.test(recipient)) {
    throw new InvalidInput([{ field: 'email', message: 'This address cannot be written to' }]);
  }
  if (BREAKS.test(subject) || subject.length > 300) {
    throw new InvalidInput([
      { field: 'subject', message: 'A subject is one line of at most 300 characters' },
    ]);
  }
  return { recipient, subject };
}

/** Renders a mail in its text and HTML parts, before the transaction that queues it. */
export async function composeMail(recipient: string, spec: LetterSpec, club: string): Promise<Mail> {
  const head = headersOf(recipient, spec.subject);
  const element = createElement(LetterMail, { letter: spec, club });
  const [html, text] = await Promise.all([render(element), render(element, { plainText: true })]);
  return { kind: spec.kind, ...head, text, html };
}
