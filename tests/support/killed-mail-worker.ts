import { connect } from '@/db/client';
import { deliverDue } from '@/lib/mail/deliver';
import { smtpSender } from '@/lib/mail/transport';

const [file, smtpUrl] = process.argv.slice(2);
const smtp = smtpSender(smtpUrl!);

await deliverDue(connect(file!), {
  send: async (mail) => {
    await smtp.send(mail);
    process.kill(process.pid, 'SIGKILL');
  },
  close: () => {},
});
