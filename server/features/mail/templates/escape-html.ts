const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

/** Text as it stands between tags and within quoted attributes. */
export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (sign) => ESCAPES[sign] ?? sign)
