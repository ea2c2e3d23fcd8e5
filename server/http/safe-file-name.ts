/** Letters and digits only: a file name must not mean anything to a shell or a browser. */
export function safeFileName(name: string): string {
  const safe = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 80)
  return safe || 'layout'
}
