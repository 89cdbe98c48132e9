/** Text of people is one line, without control characters and without marks that turn its direction. */
const LINE = '^[^\\u0000-\\u001f\\u007f\\u2028\\u2029\\u202a-\\u202e\\u2066-\\u2069]*$'

export const NAME = { type: 'string', minLength: 1, maxLength: 200, pattern: LINE } as const

/** Who signs in is told nothing about the form of an address: a wrong one is nobody's. */
export const EMAIL = { type: 'string', minLength: 3, maxLength: 254, pattern: LINE } as const

export const LICENCE = { type: ['string', 'null'], minLength: 1, maxLength: 100, pattern: LINE } as const

export const PASSWORD = { type: 'string', minLength: 1, maxLength: 256 } as const

/** Six digits of a device, or a recovery code. */
export const CODE = { type: 'string', maxLength: 40 } as const
