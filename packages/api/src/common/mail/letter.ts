import { escapeHtml } from './escape-html.js';
import type { Mail } from './mail.js';

/** A letter in plain words: lines, and at most one thing to press. */
export interface Letter {
  readonly to: string;
  readonly subject: string;
  readonly greeting: string;
  readonly lines: readonly string[];
  readonly action?: { readonly label: string; readonly url: string };
  readonly close?: string;
}

/** The same words in both forms; the look is inline because mail programs know no style sheet. */
export function letter({ to, subject, greeting, lines, action, close = 'Rivetside' }: Letter): Mail {
  const text = [
    greeting,
    '',
    ...lines,
    ...(action ? ['', `${action.label}:`, action.url] : []),
    '',
    close,
  ].join('\n');
  const paragraphs = lines.map((line) => `<p style="margin:0 0 12px">${escapeHtml(line)}</p>`).join('');
  const button = action
    ? `<p style="margin:20px 0"><a href="${escapeHtml(action.url)}" style="background:#5E6F25;color:#fff;padding:12px 20px;border-radius:4px;text-decoration:none;font-weight:bold">${escapeHtml(action.label)}</a></p><p style="margin:0 0 12px;color:#57636B;font-size:13px">${escapeHtml(action.url)}</p>`
    : '';
  const html = `<!doctype html><html lang="en"><body style="margin:0;background:#EEF1F3;padding:24px;font:16px/1.5 Lato,Arial,sans-serif;color:#1E262B"><div style="max-width:560px;margin:auto;background:#fff;border:1px solid #9BA8B0;border-top:5px solid #5E6F25;border-radius:5px;padding:24px"><p style="margin:0 0 12px"><b>${escapeHtml(greeting)}</b></p>${paragraphs}${button}<p style="margin:20px 0 0;color:#57636B">${escapeHtml(close)}</p></div></body></html>`;
  return { to, subject, text, html };
}
