import { textHash } from '#core/report/anchor.ts'
import type { ReportModel } from '#core/report/model.ts'

/** Parts of the document model that are no words of the report: names, looks, and lines of the file that move with any edit. */
const NO_WORDS: ReadonlySet<string> = new Set([
  'anchor',
  'kind',
  'svg',
  'shape',
  'box',
  'look',
  'align',
  'place',
  'number',
])

/** Longest quotation that a remark carries, in UTF-16 code units. */
export const LONGEST_QUOTE = 2000
const KEPT = 1950

/** What stood at a place, short enough to be kept with a remark; a longer one ends with a hash, so that no change escapes. */
export const quotation = (words: string): string =>
  words.length <= LONGEST_QUOTE ? words : `${words.slice(0, KEPT)} … (${textHash(words).slice(0, 16)})`

/** Collects the words under every anchor, those inside included; gives back the words of the part itself. */
function collect(part: unknown, found: Map<string, string>): string {
  if (typeof part === 'string') return part
  if (typeof part === 'number') return String(part)
  if (typeof part !== 'object' || part === null) return ''
  const inner = Object.entries(part).filter(([name]) => !NO_WORDS.has(name))
  const words = inner
    .map(([, value]) => collect(value, found))
    .filter((text) => text !== '')
    .join(' ')
  if ('anchor' in part && typeof part.anchor === 'string') found.set(part.anchor, quotation(words))
  return words
}

/**
 * What stands at each place of a report that can be pointed at.
 *
 * @returns words by anchor, as a remark would quote them
 */
export function quotations(model: ReportModel): ReadonlyMap<string, string> {
  const found = new Map<string, string>()
  collect({ front: model.front, sections: model.sections }, found)
  return found
}
