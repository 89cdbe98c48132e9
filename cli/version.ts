import manifest from '../package.json' with { type: 'json' }

/** The version of the program. */
export const VERSION: string = manifest.version
