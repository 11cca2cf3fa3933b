/**
 * A mail server for trying things out and for tests: takes every mail, sends none on, and shows what came in on a page of
 * its own. Listens on this machine only.
 */
import { createServer } from 'node:http';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

const HOST = '127.0.0.1';
const KEPT = 200;
const LARGEST = 1024 * 1024;

const SIGNS = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text) => String(text ?? '').replace(/[&<>"']/g, (sign) => SIGNS[sign]);
const linked = (text) => escaped(text).replace(/https?:\/\/[^\s<]+/g, (url) => `<a href="${url}">${url}</a>`);

const STYLE = `body{margin:0;padding:2rem clamp(1rem,4vw,3rem);background:#e6eeeb;color:#0f2a2e;font:16px/1.5 system-ui,sans-serif}
h1{margin:0}article{margin-top:1.5rem;max-width:60rem;padding:1rem 1.4rem;background:#fff;border:1px solid #cfdbd7;border-radius:4px}
h2{margin:0;font-size:1.1rem}p{margin:.3rem 0;color:#47605f}pre{white-space:pre-wrap;overflow-wrap:anywhere;font:inherit}
a{color:#0b6b75}iframe{width:100%;height:30rem;border:1px solid #cfdbd7}`;

const article = ({ to, subject, at, text, html }) => `<article><h2>${escaped(subject)}</h2>
<p>to ${escaped(to)} · ${escaped(at)}</p><pre>${linked(text)}</pre>
<details><summary>The HTML part</summary><iframe sandbox title="${escaped(subject)}" srcdoc="${escaped(html)}"></iframe></details></article>`;

const pageOf = (
  mails,
) => `<!doctype html><html lang="en"><meta charset="utf-8"><meta http-equiv="refresh" content="5">
<meta name="viewport" content="width=device-width"><title>Mail that was sent</title><style>${STYLE}</style>
<h1>Mail that was sent</h1><p>Newest first. None of it left this machine.</p>
${mails.length === 0 ? '<article><p>Nothing yet.</p></article>' : mails.map(article).join('')}`;

const addressesOf = (field) =>
  [field]
    .flat()
    .flatMap((one) => one?.value ?? [])
    .map(({ address }) => address);

async function mailOf(raw) {
  const parsed = await simpleParser(raw);
  return {
    to: addressesOf(parsed.to).join(', '),
    from: parsed.from?.text ?? '',
    subject: parsed.subject ?? '',
    messageId: parsed.messageId ?? '',
    headers: parsed.headerLines.map(({ key }) => key),
    text: parsed.text ?? '',
    html: parsed.html || '',
    at: new Date().toISOString(),
  };
}

async function bytesOf(stream) {
  const chunks = [];
  for await (const chunk of stream) chunks.push(chunk);
  return Buffer.concat(chunks);
}

const listening = (server, port) =>
  new Promise((resolve, reject) => {
    server.on('error', reject);
    server.listen(port, HOST, () => resolve(server.address().port));
  });

function smtpServer(take) {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    size: LARGEST,
    onData(stream, _session, done) {
      bytesOf(stream)
        .then(mailOf)
        .then(take)
        .then(() => done(), done);
    },
  });
  return {
    listen: async (port) => {
      await new Promise((resolve, reject) => {
        server.on('error', reject);
        server.listen(port, HOST, resolve);
      });
      return server.server.address().port;
    },
    close: () => new Promise((resolve) => server.close(resolve)),
  };
}

function webServer(mails) {
  return createServer((request, response) => {
    const asked = (request.headers.host ?? '').replace(/:\d+$/, '');
    if (asked !== HOST && asked !== 'localhost') {
      response.writeHead(421).end();
      return;
    }
    response.writeHead(200, {
      'Content-Type': 'text/html; charset=utf-8',
      'Content-Security-Policy':
        "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; frame-ancestors 'none'",
      'X-Content-Type-Options': 'nosniff',
    });
    response.end(pageOf(mails));
  });
}

/** Starts the mail server and its page; port 0 takes any free one. */
export async function startMailBox({ smtpPort = 0, pagePort = 0 } = {}) {
  const mails = [];
  const smtp = smtpServer((mail) => {
    mails.unshift(mail);
    mails.length = Math.min(mails.length, KEPT);
  });
  const web = webServer(mails);
  const smtpAt = await smtp.listen(smtpPort);
  const pageAt = await listening(web, pagePort);
  return {
    mails,
    smtpUrl: `smtp://${HOST}:${smtpAt}`,
    pageUrl: `http://${HOST}:${pageAt}`,
    close: () => Promise.all([smtp.close(), new Promise((resolve) => web.close(resolve))]),
  };
}

if (process.argv[1]?.endsWith('mail-box.mjs')) {
  const [smtpPort = 3025, pagePort = 3026] = process.argv.slice(2).map(Number);
  const box = await startMailBox({ smtpPort, pagePort });
  console.log(
    `Set SMTP_URL=${box.smtpUrl} and MAIL_BOX_URL=${box.pageUrl}; what was sent stands at ${box.pageUrl}`,
  );
}
