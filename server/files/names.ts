const LONGEST = 120

/** Controls, line ends of every kind, and what turns or hides text: bidirectional controls, zero-width characters, half characters. */
const UNSEEN = /[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}\p{Default_Ignorable_Code_Point}]/gu

/** Cuts between characters as a reader counts them, at most so many code points. */
function cut(text: string, most: number): string {
  let kept = ''
  let length = 0
  for (const { segment } of new Intl.Segmenter('en', { granularity: 'grapheme' }).segment(text)) {
    length += [...segment].length
    if (length > most) break
    kept += segment
  }
  return kept
}

/** Cuts in the middle, so that the ending of a file's name stays. */
function shortened(name: string): string {
  if ([...name].length <= LONGEST) return name
  const ending = /\.[\p{L}\p{N}]{1,10}$/u.exec(name)?.[0] ?? ''
  return `${cut(name.slice(0, name.length - ending.length), LONGEST - ending.length - 1)}…${ending}`
}

/**
 * A file's name for people to read, from what an uploader sent: its last part, without anything unseen, at most
 * 120 characters. It is never a path, a header or a key.
 */
export function displayName(sent: string): string {
  const last = sent.split(/[/\\]/).at(-1) ?? ''
  const seen = last.replace(/\s+/g, ' ').replace(UNSEEN, '').normalize('NFC')
  const name = shortened(seen.trim().replace(/^\.+/, '').trim())
  return name === '' ? 'unnamed' : name
}

/** Characters that RFC 8187 lets stand in an extended value. */
const PLAIN = /[^A-Za-z0-9!#$&+.^_`|~-]/g

const encoded = (text: string): string =>
  encodeURIComponent(text).replace(PLAIN, (sign) => (sign === '%' ? sign : `%${hex(sign)}`))

const hex = (sign: string): string => sign.charCodeAt(0).toString(16).toUpperCase().padStart(2, '0')

/** A name that any reader of headers takes: nothing but plain letters, digits and a few signs. */
const fallback = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^A-Za-z0-9._ -]/g, '_')

/** The header `Content-Disposition` (RFC 6266) for a file handed out under a name: one for old readers, one in UTF-8. */
export function contentDisposition(how: 'attachment' | 'inline', sent: string): string {
  const name = displayName(sent)
  return `${how}; filename="${fallback(name)}"; filename*=UTF-8''${encoded(name)}`
}
