import { readFileSync } from 'node:fs'
import { check, type Judged } from '#core/engine.ts'
import { SHIPPED_BOOKS, shippedBook } from '#core/judge/shipped.ts'
import { reportModel } from '#core/report/model.ts'
import type { ReportScene } from '#core/report/scene.ts'
import { reportScene } from '#core/report/scene.ts'
import { patched } from '../judge/patch.ts'

/** The text of an example. */
export const exampleText = (name: string): string => readFileSync(`examples/${name}.skerry.yaml`, 'utf8')

/** A text judged by the books that ship; a text that cannot be judged fails the test with what is wrong. */
export function judgedText(text: string): Judged {
  const checked = check(text, { find: shippedBook, names: SHIPPED_BOOKS })
  if (checked.kind === 'judged') return checked
  throw new Error(checked.problems.map(({ path, message }) => `${path.join('.')}: ${message}`).join('\n'))
}

export const judgedExample = (name: string): Judged => judgedText(exampleText(name))

/** The rules' base file with changes, judged. */
export const judgedBase = (changes: Parameters<typeof patched>[0] = {}): Judged => judgedText(patched(changes))

export const context = { file: 'a.skerry.yaml', hash: 'ab'.repeat(32), draft: true } as const

export const sceneOf = (judged: Judged): ReportScene => reportScene(judged, context)

export const modelOf = (judged: Judged) => reportModel(judged, context)

/** Every anchor below a part of a model, in the order of the page. */
export function anchorsOf(part: unknown): string[] {
  if (Array.isArray(part)) return part.flatMap(anchorsOf)
  if (typeof part !== 'object' || part === null) return []
  return Object.entries(part).flatMap(([name, value]) =>
    name === 'anchor' && typeof value === 'string' ? [value] : anchorsOf(value),
  )
}

/** Every text below a part of a model, drawings left out. */
export function textsOf(part: unknown): string[] {
  if (typeof part === 'string') return [part]
  if (Array.isArray(part)) return part.flatMap(textsOf)
  if (typeof part !== 'object' || part === null) return []
  return Object.entries(part).flatMap(([name, value]) => (name === 'anchor' || name === 'svg' ? [] : textsOf(value)))
}
