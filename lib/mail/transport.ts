import 'server-only';
import { createTransport } from 'nodemailer';
import type { ClaimedMail } from '@/db/queries/outbox';
import { env, publicUrl } from '@/lib/env';

export interface Sender {
  send(mail: ClaimedMail): Promise<void>;
  close(): void;
}

const SECOND = 1000;

/** Sends over SMTP. A mail keeps its Message-ID over every attempt, so that a second copy can be told as one. */
export function smtpSender(url: string): Sender {
  const transport = createTransport(url, {
    from: env().MAIL_FROM,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  Object.assign(transport.options, {
    connectionTimeout: 10 * SECOND,
    greetingTimeout: 10 * SECOND,
    socketTimeout: 30 * SECOND,
  });
  const host = new URL(publicUrl()).hostname;
  return {
    async send({ id, recipient, subject, text, html }) {
      await transport.sendMail({
        to: { name: '', address: recipient },
        subject,
        text,
        html,
        messageId: `<${id}@${host}>`,
      });
    },
    close: () => transport.close(),
  };
}
