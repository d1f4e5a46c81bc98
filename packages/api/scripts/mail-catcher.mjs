// Takes every mail by SMTP and shows it as a page, for the compose file. Keeps the newest 200 in memory only.
import { createServer } from 'node:http';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

const KEPT = 200;
const mails = [];

const escape = (text) => String(text ?? '').replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);

new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  onData(stream, session, done) {
    simpleParser(stream).then(
      (mail) => {
        mails.unshift(mail);
        mails.length = Math.min(mails.length, KEPT);
        done();
      },
      (error) => done(error),
    );
  },
}).listen(1025);

createServer((request, response) => {
  response.setHeader('content-type', 'text/html; charset=utf-8');
  response.setHeader('content-security-policy', "default-src 'none'");
  const one = mails[Number(request.url.slice(1)) - 1];
  const list = mails.map(
    (mail, at) => `<li><a href="/${at + 1}">${escape(mail.subject)}</a> to ${escape(mail.to?.text)}</li>`,
  );
  response.end(
    `<!doctype html><title>Mail</title><h1>Mail</h1>${one ? `<h2>${escape(one.subject)}</h2><pre>${escape(one.text)}</pre>` : ''}<ul>${list.join('')}</ul>`,
  );
}).listen(8025);
