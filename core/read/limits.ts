/**
 * How much a file may hold. The bounds keep one bad file from stopping the program that reads it; they are our own
 * choice, many times what the largest building needs.
 */
export const MAX_BYTES = 1024 * 1024
/** Lists and blocks inside each other, the whole file counting as one. */
export const MAX_DEPTH = 32
export const MAX_KEYS = 40_000
export const MAX_ITEMS = 20_000
/** Words and marks that the slow reader looks at: it needs a second for some hundred thousand. */
export const MAX_TOKENS = 200_000
/** Characters (UTF-16 code units) of one value. */
export const MAX_SCALAR = 64 * 1024
/** Problems of one file that are told; the rest is counted. */
export const MAX_PROBLEMS = 200
/** Digits that a double-precision number keeps exactly, IEEE 754. */
export const MAX_DIGITS = 15
