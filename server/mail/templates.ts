/** The words of every mail, as plain text and as simple HTML with the same content. */
import type { Role } from '@shared/protocol/roles'

export interface MailContent {
  subject: string
  text: string
  html: string
}

export interface MailParts {
  subject: string
  paragraphs: string[]
  link?: { label: string; url: string }
}

const ROLE_WORDS: Record<Role, string> = {
  viewer: 'a viewer',
  shop: 'a member of the shop',
  designer: 'a designer',
  manager: 'an engineering manager',
  admin: 'an administrator',
}

function escapeHtml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
}

/** Line ends in a subject would start a header of their own. */
const oneLine = (text: string) => text.replace(/\s+/g, ' ').trim()

export function renderMail({ subject, paragraphs, link }: MailParts): MailContent {
  const text = [...paragraphs, ...(link ? [`${link.label}:\n${link.url}`] : []), 'Hubstead'].join('\n\n')
  const html = [
    '<!doctype html><html lang="en"><body style="font-family:sans-serif;color:#1F242C;max-width:34em">',
    ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
    ...(link ? [`<p><a href="${escapeHtml(link.url)}">${escapeHtml(link.label)}</a></p>`] : []),
    '<p style="color:#667080">Hubstead</p></body></html>',
  ].join('\n')
  return { subject: oneLine(subject), text, html }
}

export const confirmationMail = (name: string, url: string): MailContent =>
  renderMail({
    subject: 'Confirm your e-mail address for Hubstead',
    paragraphs: [
      `Hello ${name},`,
      'an account at Hubstead was opened with this address. Open the link to confirm that it is yours; it works for one day.',
      'If you did not ask for it, do nothing: without the link the account stays closed.',
    ],
    link: { label: 'Confirm the address', url },
  })

export const alreadyRegisteredMail = (name: string, signInUrl: string): MailContent =>
  renderMail({
    subject: 'You already have a Hubstead account',
    paragraphs: [
      `Hello ${name},`,
      'somebody, probably you, tried to open an account with this address. You have one already: sign in, or ask for a new password there.',
    ],
    link: { label: 'Sign in', url: signInUrl },
  })

export const resetPasswordMail = (name: string, url: string): MailContent =>
  renderMail({
    subject: 'Choose a new Hubstead password',
    paragraphs: [
      `Hello ${name},`,
      'open the link to choose a new password. It works once and for one hour. All devices are signed out when you do.',
      'If you did not ask for it, do nothing: your password stays as it is.',
    ],
    link: { label: 'Choose a new password', url },
  })

export const passwordChangedMail = (name: string, forgottenUrl: string): MailContent =>
  renderMail({
    subject: 'Your Hubstead password was changed',
    paragraphs: [
      `Hello ${name},`,
      'the password of your account was changed and other devices were signed out. If that was not you, choose a new password at once.',
    ],
    link: { label: 'Choose a new password', url: forgottenUrl },
  })

export const invitationMail = (
  inviterName: string,
  workspaceName: string,
  role: Role,
  url: string,
): MailContent =>
  renderMail({
    subject: `${inviterName} invites you to ${workspaceName} at Hubstead`,
    paragraphs: [
      'Hello,',
      `${inviterName} invites you to work in ${workspaceName} as ${ROLE_WORDS[role]}. Sign in or open an account with this address to accept; the invitation is good for seven days.`,
    ],
    link: { label: 'See the invitation', url },
  })
