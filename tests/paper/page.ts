import type { PaperOptions } from '#core/paper/options.ts'
import { typeset } from '#core/paper/paper.ts'
import { fonts } from './fonts.ts'
import { sampleHtml, sampleOptions } from './sample.ts'

const plain: PaperOptions = { fonts, title: 'Page', author: 'Nobody', language: 'en', created: '2026-10-13T16:05:00Z' }

/** A page of HTML with nothing around it. */
export const page = (html: string, changes: Partial<PaperOptions> = {}): Uint8Array =>
  typeset(html, { ...plain, ...changes })

/** The sample that uses everything. */
export const sample = (): Uint8Array => typeset(sampleHtml, sampleOptions)
