import { Controller, Get, Header, Param } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import type { AddressObject } from 'mailparser';
import { Public } from '../access/access.decorator.js';
import { Settings } from '../config/settings.js';
import { NotFound } from '../errors/app-error.js';
import { escapeHtml } from './escape-html.js';
import { type CaughtMail, MailCatcher } from './mail-catcher.js';

const page = (title: string, body: string) =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escapeHtml(title)}</title></head><body><h1>${escapeHtml(title)}</h1>${body}</body></html>`;
/** Links in caught mails must be pressable: only those of plain http are made so. */
const linked = (text: string) =>
  escapeHtml(text).replace(
    /https?:\/\/[^\s&]+(?:&#38;[^\s&]+)*/g,
    (url) => `<a href="${url}" rel="noreferrer">${url}</a>`,
  );
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
  @Header('cache-control', 'no-store')
  list(): string {
    const rows = this.caught().map(
      ({ number, mail }) =>
        `<li><a href="/dev/mail/${number}">${escapeHtml(mail.subject ?? '')}</a> to ${escapeHtml(addressed(mail.to))}, ${mail.date?.toISOString() ?? ''}</li>`,
    );
    const none = this.settings.env.SMTP_URL ? 'Mails go to SMTP_URL.' : 'No mail yet.';
    return page('Caught mails', rows.length > 0 ? `<ul>${rows.join('')}</ul>` : `<p>${none}</p>`);
  }

  @Get(':number')
  @Public()
  @Header('content-type', 'text/html; charset=utf-8')
  @Header('cache-control', 'no-store')
  one(@Param('number') number: string): string {
    const found = this.caught().find((caught) => String(caught.number) === number);
    if (!found) throw new NotFound('mail');
    const { mail } = found;
    const html = typeof mail.html === 'string' ? mail.html : '';
    return page(
      mail.subject ?? '',
      `<p>to ${escapeHtml(addressed(mail.to))}</p><pre>${linked(mail.text ?? '')}</pre><details><summary>As HTML</summary><pre>${escapeHtml(html)}</pre></details><p><a href="/dev/mail">All caught mails</a></p>`,
    );
  }

  private caught(): readonly CaughtMail[] {
    if (this.settings.production) throw new NotFound('page');
    return this.catcher.caught;
  }
}
