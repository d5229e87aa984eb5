import { texts } from '#shared/locales/en/letters.js';
import { escapeHtml } from './escape-html.js';
import type { ReceivedLetter } from './inbox.js';

/** The inbox of development as one plain page. */
export function inboxPage(letters: readonly ReceivedLetter[]): string {
  const { inbox } = texts;
  const list = letters.map(letterPart).join('');
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${inbox.title}</title>
<style>body{font:18px/1.5 sans-serif;max-width:44rem;margin:2rem auto;padding:0 1rem;color:#2e231b;background:#f6f1e7}
article{background:#fffdf8;border:1px solid #d8ccb8;padding:1rem;margin:1rem 0}h2{margin:0;font-size:1.1rem}
pre{white-space:pre-wrap;overflow-wrap:anywhere;font:inherit}a{color:#8c2f1d}</style></head>
<body><h1>${inbox.title}</h1><p>${inbox.lead}</p>${list === '' ? `<p>${inbox.empty}</p>` : list}</body></html>`;
}

function letterPart({ recipients, subject, text }: ReceivedLetter): string {
  const linked = escapeHtml(text).replace(/https?:\/\/[^\s<]+/gu, (url) => `<a href="${url}">${url}</a>`);
  return `<article><h2>${escapeHtml(subject)}</h2><p>${escapeHtml(recipients.join(', '))}</p><pre>${linked}</pre></article>`;
}
