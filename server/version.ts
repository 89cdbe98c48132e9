import manifest from '../package.json' with { type: 'json' }

/** The version of the program, kept with every judgement. */
export const VERSION: string = manifest.version
