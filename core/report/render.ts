import type { Judged } from '#core/engine.ts'
import type { Install } from '#core/install.ts'
import type { FontName } from '#core/paper/options.ts'
import { typeset } from '#core/paper/paper.ts'
export interface RenderOptions {
  readonly text: string
  readonly file: string
  readonly fonts: Readonly<Record<FontName, Uint8Array>>
  readonly created: string
  readonly draft: boolean
}
export function createdFrom(install: Install): string {
  return `${install.report.inspected?.from ?? '2026-01-01'}T00:00:00Z`
}
export function renderReport(_judged: Judged, options: RenderOptions): Uint8Array {
  return typeset('<h1>x</h1>', {
    fonts: options.fonts,
    title: 'x',
    author: 'x',
    language: 'en',
    created: options.created,
  })
}
export function renderFieldsheet(_judged: Judged, options: RenderOptions): Uint8Array {
  return renderReport(_judged, options)
}
