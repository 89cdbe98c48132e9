import type { FileResult } from '#cli/result.ts'

/** What a format may draw on beside the results. */
export interface FormatScene {
  readonly version: string
  readonly colour: boolean
  readonly width: number
  readonly verbose: boolean
  readonly quiet: boolean
  readonly strict: boolean
}

/** A format is one pure function. */
export type Format = (results: readonly FileResult[], scene: FormatScene) => string
