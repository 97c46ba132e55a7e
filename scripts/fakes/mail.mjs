// A local stand-in for the mail provider: takes mail over SMTP and shows it on a page. Nothing leaves this machine.
import http from 'node:http';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

const smtpPort = Number(process.env.FAKE_SMTP_PORT ?? 0);
const pagePort = Number(process.env.FAKE_MAIL_PAGE_PORT ?? 0);
const mails = [];

const escape = (text) => String(text ?? '').replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);
const linked = (text) =>
  escape(text).replace(/https?:\/\/[^\s<]+/g, (address) => `<a href="${address}">${address}</a>`);

const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  size: 30 * 1024 * 1024,
  onData(stream, _session, done) {
    simpleParser(stream).then((mail) => {
      mails.unshift(mail);
      mails.length = Math.min(mails.length, 200);
      done();
    }, done);
  },
});

function page() {
  const entries = mails.map(
    (mail, index) => `<article><h2>${escape(mail.subject)}</h2>
      <p>to ${escape(mail.to?.text)} · from ${escape(mail.from?.text)} · ${escape(mail.date?.toISOString())}</p>
      <pre>${linked(mail.text)}</pre>
      ${mail.attachments
        .map(
          (file, at) =>
            `<p><a href="/mail/${index}/${at}">${escape(file.filename)}</a> (${file.size} bytes)</p>`,
        )
        .join('')}</article>`,
  );
  return `<!doctype html><html lang="en"><meta charset="utf-8"><title>Mail sent on this machine</title>
    <style>body{font:16px/1.5 sans-serif;max-width:46rem;margin:2rem auto;padding:0 1rem;background:#f5efe3;color:#231d16}
    article{border-top:1px solid #231d16;padding:.5rem 0 1.5rem}h2{margin:.25rem 0}pre{white-space:pre-wrap;font:inherit}</style>
    <h1>Mail sent on this machine</h1><p>Newest first. Nothing here left the machine.</p>
    ${entries.join('') || '<p>No mail yet.</p>'}</html>`;
}

const web = http.createServer((request, response) => {
  if (request.url === '/mails.json') {
    const list = mails.map(({ subject, to, text, messageId, attachments }) => ({
      subject,
      to: to?.text,
      text,
      messageId,
      attachments: attachments.map(({ filename, contentType, size }) => ({ filename, contentType, size })),
    }));
    response.writeHead(200, { 'content-type': 'application/json' }).end(JSON.stringify(list));
    return;
  }
  const file = /^\/mail\/(\d+)\/(\d+)$/.exec(request.url ?? '');
  const attachment = file && mails[Number(file[1])]?.attachments[Number(file[2])];
  if (attachment) {
    response.writeHead(200, { 'content-type': attachment.contentType }).end(attachment.content);
    return;
  }
  response
    .writeHead(request.url === '/' ? 200 : 404, { 'content-type': 'text/html; charset=utf-8' })
    .end(page());
});

smtp.on('error', (error) => console.error(`mail stand-in: ${error.message}`));
smtp.listen(smtpPort, '127.0.0.1');
web.listen(pagePort, '127.0.0.1');
process.on('SIGTERM', () => process.exit(0));
process.on('SIGINT', () => process.exit(0));
