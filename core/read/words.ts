const SHOWN = 60

/**
 * A piece of the file between quotation marks, cut where it would fill the line; characters that cannot be seen are
 * written as their number.
 *
 * @param text what was found
 */
export function quote(text: string): string {
  return `“${cut(text)}”`
}

/** As `quote`, without the quotation marks: for what is to be written instead. */
export function cut(text: string): string {
  const short = text.length > SHOWN ? `${text.slice(0, SHOWN).trimEnd()}…` : text
  return short.replace(/[\p{Cc}\p{Cf}\p{Cs}]/gu, named)
}

/** `U+202E`: how a character is named in Unicode. */
export function named(character: string): string {
  return `U+${Number(character.codePointAt(0)).toString(16).toUpperCase().padStart(4, '0')}`
}

/** `a, b or c`. */
export function either(words: readonly string[]): string {
  if (words.length < 2) return words.join('')
  return `${words.slice(0, -1).join(', ')} or ${words.at(-1)}`
}
