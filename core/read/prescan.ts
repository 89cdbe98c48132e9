import { MAX_DEPTH, MAX_ITEMS, MAX_KEYS, MAX_SCALAR, MAX_TOKENS } from './limits.ts'

/** Which limit a text breaks, and where. */
export interface Excess {
  readonly limit: 'depth' | 'keys' | 'items' | 'tokens' | 'length'
  readonly offset: number
}

/** Tokens of the lexer that stand for nothing in the text. */
const MARKS: ReadonlySet<string> = new Set(['\u0002', '\u0018', '\u001f'])

/**
 * Counts nesting, keys and items in a stream of tokens, before any parser sees the text: parsers call themselves for
 * each level, and one of them brings the whole program down on some thousand levels. Nesting is never counted too low
 * by more than the pairs inside a list, `[a: [b: …]]`, which add a level that has no bracket of its own.
 *
 * Commas between keys cannot be told from those between items here, so the limits are taken together for them.
 *
 * @param tokens pieces of the text in order, as `Lexer.lex` of the package yaml yields them
 * @returns the first limit that is broken, or undefined
 */
export function prescan(tokens: Iterable<string>): Excess | undefined {
  const scan = new Scan()
  for (const token of tokens) {
    const excess = scan.take(token)
    if (excess !== undefined) return excess
  }
  return undefined
}

class Scan {
  /** Offset, and column of the next token. */
  #offset = 0
  #column = 0
  /** Column of the last token that can be a key. */
  #keyColumn = 0
  #flow = 0
  #keys = 0
  #items = 0
  #tokens = 0
  /** Columns of the open blocks, doubled; a list in the column of its key is one more. */
  readonly #blocks: number[] = []

  take(token: string): Excess | undefined {
    if (MARKS.has(token)) return undefined
    const limit = this.#count(token) ?? this.#token(token)
    const offset = this.#offset
    this.#advance(token)
    return limit === undefined ? undefined : { limit, offset }
  }

  #count(token: string): Excess['limit'] | undefined {
    switch (token) {
      case '[':
      case '{':
        this.#keyColumn = this.#column
        this.#flow++
        return this.#depth()
      case ']':
      case '}':
        this.#flow = Math.max(this.#flow - 1, 0)
        return undefined
      case '-':
        return this.#block(this.#column * 2 + 1) ?? this.#item()
      case ',':
        return this.#item()
      case '?':
        return this.#block(this.#column * 2) ?? this.#key()
      case ':':
        return this.#block(this.#keyColumn * 2) ?? this.#key()
      default:
        if (token.trim() !== '' && this.#flow === 0) this.#keyColumn = this.#column
        return undefined
    }
  }

  #block(column: number): Excess['limit'] | undefined {
    if (this.#flow > 0) return undefined
    while ((this.#blocks.at(-1) ?? -1) > column) this.#blocks.pop()
    if (this.#blocks.at(-1) !== column) this.#blocks.push(column)
    return this.#depth()
  }

  #depth(): Excess['limit'] | undefined {
    return this.#blocks.length + this.#flow > MAX_DEPTH ? 'depth' : undefined
  }

  #key(): Excess['limit'] | undefined {
    return ++this.#keys > MAX_KEYS ? 'keys' : undefined
  }

  #item(): Excess['limit'] | undefined {
    return ++this.#items > MAX_ITEMS + MAX_KEYS ? 'items' : undefined
  }

  #token(token: string): Excess['limit'] | undefined {
    if (token.trim() === '') return undefined
    if (token.length > MAX_SCALAR) return 'length'
    return ++this.#tokens > MAX_TOKENS ? 'tokens' : undefined
  }

  #advance(token: string): void {
    this.#offset += token.length
    const lineEnd = token.lastIndexOf('\n')
    this.#column = lineEnd === -1 ? this.#column + token.length : token.length - lineEnd - 1
  }
}
