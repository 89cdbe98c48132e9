import { isAlias, isPair, isScalar, Lexer, parseDocument, visit } from 'yaml'
import { guard } from '#core/read/guard.ts'
import { keyFault } from '#core/read/keys.ts'
import { resolvePlain } from '#core/read/plain.ts'

const OPTIONS = {
  version: '1.2',
  schema: 'core',
  merge: false,
  stringKeys: true,
  prettyErrors: false,
} as const

/**
 * The values of a text as a second, independent parser sees them; undefined where the format refuses it. The text must
 * not be nested deeply.
 */
export function slowTree(text: string): { readonly tree: unknown } | undefined {
  if (guard(text).length > 0 || hasTagOrAnchor(text)) return undefined
  // The parser stumbles over a list behind a byte order mark, and over blanks before CRLF in a block of text.
  const document = parseDocument(text.replace(/^\ufeff/, '\n').replaceAll('\r\n', '\n'), OPTIONS)
  if (document.errors.length > 0 || document.warnings.length > 0) return undefined
  let refused = false
  visit(document, (key, node) => {
    if (isAlias(node)) refused = true
    if (isPair(node) && refusedKey(node.key)) refused = true
    if (isScalar(node) && key !== 'key' && isPlain(node) && 'fault' in resolvePlain(node.source ?? '')) refused = true
  })
  // JSON knows no minus nothing; neither does the format.
  const tree: unknown = refused ? null : JSON.parse(JSON.stringify(document.toJS()))
  return tree === null || typeof tree !== 'object' ? undefined : { tree }
}

function refusedKey(key: unknown): boolean {
  return !isScalar(key) || keyFault(String(key.value), isPlain(key)) !== undefined
}

function isPlain(node: { readonly type?: string | null }): boolean {
  return node.type === 'PLAIN' || node.type === undefined || node.type === null
}

function hasTagOrAnchor(text: string): boolean {
  let inScalar = false
  for (const token of new Lexer().lex(text)) {
    if (!inScalar && /^[!&]/.test(token)) return true
    inScalar = token === '\u001f'
  }
  return false
}
