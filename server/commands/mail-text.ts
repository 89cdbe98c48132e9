/** Text as part of HTML. */
export const escapeHtml = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')

/** A header is one line: whatever a file or a name brings along, it stays one. */
export const oneLine = (text: string): string =>
  text.replaceAll(/[\u0000-\u001f\u007f\u2028\u2029]+/g, ' ').slice(0, 200)
