import type { Format } from './format.ts'

/** The formats by name, each loaded when it is asked for. */
export const FORMATS = {
  text: async (): Promise<Format> => (await import('./text.ts')).text,
  json: async (): Promise<Format> => (await import('./json.ts')).json,
  sarif: async (): Promise<Format> => (await import('./sarif.ts')).sarif,
  junit: async (): Promise<Format> => (await import('./junit.ts')).junit,
  github: async (): Promise<Format> => (await import('./github.ts')).github,
} as const

export type FormatName = keyof typeof FORMATS
export const FORMAT_NAMES = Object.keys(FORMATS) as readonly FormatName[]
