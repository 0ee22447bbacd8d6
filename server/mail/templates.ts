export interface Message {
  to: { name: string; address: string };
  subject: string;
  text: string;
  html: string;
}

interface Recipient {
  name: string;
  email: string;
}

const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (sign) => escapes[sign]);

/** The same paragraphs as text and as HTML; a link stands in its own paragraph. */
function message(to: Recipient, subject: string, paragraphs: string[], link?: string): Message {
  const greeting = `Hello ${to.name},`;
  const [first, ...rest] = paragraphs;
  const text = [greeting, first, ...(link ? [link] : []), ...rest].join('\n\n');
  const html = [
    `<p>${escapeHtml(greeting)}</p>`,
    `<p>${escapeHtml(first)}</p>`,
    ...(link ? [`<p><a href="${escapeHtml(link)}">${escapeHtml(link)}</a></p>`] : []),
    ...rest.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
  ].join('\n');
  return {
    to: { name: to.name, address: to.email },
    subject,
    text: `${text}\n`,
    html: `<!doctype html>\n<html lang="en"><body style="font-family: monospace">\n${html}\n</body></html>\n`,
  };
}

export const invitationMail = (to: Recipient, invitedBy: string, link: string): Message =>
  message(
    to,
    'Your invitation to Millpond',
    [
      `${invitedBy} invites you to Millpond, where the decoupling of your boards is planned. Choose your password here:`,
      'The link works once and for seven days. If you did not expect it, do nothing.',
    ],
    link,
  );

export const resetMail = (to: Recipient, link: string): Message =>
  message(
    to,
    'Choose a new Millpond password',
    [
      'Someone, probably you, asked for a new password. Choose it here:',
      'The link works once and for one hour. If it was not you, do nothing: your password stays as it is.',
    ],
    link,
  );

export const passwordChangedMail = (to: Recipient, baseUrl: string): Message =>
  message(
    to,
    'Your Millpond password was changed',
    [
      'Your password was changed just now, and you are signed out everywhere else.',
      'If it was not you, choose a new one on the sign-in page at once and tell your administrator.',
    ],
    baseUrl,
  );
