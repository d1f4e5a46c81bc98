import { Controller, Get, Header, Param } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import type { AddressObject } from 'mailparser';
import { Public } from '../access/access.decorator.js';
import { Settings } from '../config/settings.js';
import { NotFound } from '../errors/app-error.js';
import { MailCatcher } from './mail-catcher.js';

const escape = (text: string) => text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);
const page = (title: string, body: string) =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escape(title)}</title></head><body><h1>${escape(title)}</h1>${body}</body></html>`;
/** Links in caught mails must be pressable: only those of plain http are made so. */
const linked = (text: string) =>
  escape(text).replace(/https?:\/\/[^\s&]+(?:&#38;[^\s&]+)*/g, (url) => `<a href="${url}">${url}</a>`);
const addressed = (to: AddressObject | AddressObject[] | undefined) =>
  [to ?? []]
    .flat()
    .map(({ text }) => text)
    .join(', ');

/** The caught mails, for whoever tries the app out; does not exist in production. */
@ApiExcludeController()
@Controller('dev/mail')
export class DevMailController {
  constructor(
    private readonly catcher: MailCatcher,
    private readonly settings: Settings,
  ) {}

  @Get()
  @Public()
  @Header('content-type', 'text/html; charset=utf-8')
  list(): string {
    const { mails } = this.found();
    const rows = mails.map(
      ({ subject = '', to }, at) =>
        `<li><a href="/dev/mail/${at + 1}">${escape(subject)}</a> to ${escape(addressed(to))}</li>`,
    );
    return page('Caught mails', rows.length ? `<ol>${rows.join('')}</ol>` : '<p>No mail yet.</p>');
  }

  @Get(':number')
  @Public()
  @Header('content-type', 'text/html; charset=utf-8')
  one(@Param('number') number: string): string {
    const mail = this.found().mails[Number(number) - 1];
    if (!mail) throw new NotFound('mail');
    return page(
      mail.subject ?? '',
      `<p>to ${escape(addressed(mail.to))}</p><pre>${linked(mail.text ?? '')}</pre>`,
    );
  }

  private found(): MailCatcher {
    if (this.settings.production) throw new NotFound('page');
    return this.catcher;
  }
}
