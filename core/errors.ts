import type { Path, Problem, Range } from './glossary.ts'

/**
 * Everything that can keep an install file from being judged, one line of meaning each. The list is closed: a new code
 * goes here first. Sentences for a particular file are made where the problem is found.
 */
export const PROBLEM_CODES = {
  // the text, before anything is parsed
  'not-utf8': 'The bytes are not UTF-8 text.',
  'too-large': 'The file is larger than the reader accepts.',
  'forbidden-character': 'A control, direction or otherwise invisible character that the format does not allow.',
  'empty-file': 'There is nothing in the file.',
  // YAML
  syntax: 'The text is not well-formed YAML.',
  tab: 'A tab stands where YAML allows spaces only.',
  indentation: 'A line is indented differently from what it belongs to.',
  'unclosed-quote': 'A quote is opened and never closed.',
  'unclosed-bracket': 'A bracket is opened and never closed, or closed and never opened.',
  'missing-comma': 'Two entries inside brackets are not separated by a comma.',
  'missing-space': 'A space is missing after a colon, a dash or before a comment.',
  'missing-colon': 'A line among keys and values has no colon.',
  'needs-quotes': 'A value starts with a character that has a meaning of its own in YAML.',
  'bad-escape': 'A backslash inside double quotes is followed by something that it cannot escape.',
  'too-deep': 'Lists and blocks are nested more deeply than the reader accepts.',
  'too-many-keys': 'There are more keys than the reader accepts.',
  'too-many-items': 'There are more list items than the reader accepts.',
  'text-too-long': 'One value is longer than the reader accepts.',
  directive: 'A YAML directive, which the format does not use.',
  tag: 'A YAML tag, which the format does not use.',
  anchor: 'A YAML anchor or alias, which the format does not use.',
  'merge-key': 'A YAML merge key, which the format does not use.',
  'several-documents': 'More than one YAML document in a file.',
  'duplicate-key': 'The same key stands twice in one block.',
  'reserved-key': 'A key that the reader refuses because programs give it a meaning of their own.',
  'key-not-text': 'A key that is empty or is itself a list or a block.',
  'too-many-problems': 'More problems than are shown.',
  // numbers and quantities
  'number-not-finite': 'Not a number that can be worked with: infinite, or beyond the range of numbers.',
  'number-too-precise': 'More significant digits than can be kept exactly.',
  'number-leading-zero': 'A number that begins with a needless zero.',
  'number-separator': 'A number with separators between its digits.',
  'number-sexagesimal': 'A number in base sixty, such as 1:30.',
  'number-radix': 'A number that is not decimal, such as 0x1F.',
  'decimal-comma': 'A comma where a decimal point belongs.',
  'not-a-quantity': 'A number with or without a unit was expected.',
  'unit-unknown': 'A unit that is not known.',
  'unit-of-wrong-kind': 'A unit of another kind of quantity.',
  'reading-bound': 'A reading beyond the range of the instrument that cannot be understood.',
  'reading-test-voltage': 'A test voltage that cannot be understood, or stands where none belongs.',
  'reading-no-trip': '“no trip” where no time of a residual-current device is asked for.',
  // shorthand of the trade
  'device-unknown': 'A protective device that cannot be understood.',
  'cable-unknown': 'A cable that cannot be understood.',
  'size-not-standard': 'A conductor size that IEC 60228 does not list.',
  // shape
  'unknown-key': 'A key that the format does not know at this place.',
  'missing-key': 'A key that must be given is missing.',
  'wrong-type': 'A value of another type than the place takes.',
  'not-allowed-value': 'A value outside the list of what the place takes.',
  'too-many': 'More entries than the place takes.',
  'too-few': 'Fewer entries than the place takes.',
  'out-of-range': 'A number outside the range of the place.',
  'too-long': 'A text longer than the place takes.',
  pattern: 'A text that does not have the form of the place.',
  'conflicting-keys': 'Two keys of one block that exclude each other.',
  'bad-date': 'Not a date of the calendar in the form 2026-10-13.',
  // topology and references
  'dangling-name': 'A name that nothing in the file carries.',
  'not-a-feeder': 'A name of something that nothing can be fed from, such as a circuit or an inverter.',
  loop: 'Things that feed each other in a circle.',
  'duplicate-name': 'Two things carry the same name.',
  // editing
  'edit-refused': 'A value cannot be written at its place without touching something else.',
} as const satisfies Readonly<Record<string, string>>

/** One of the closed list above. */
export type ProblemCode = keyof typeof PROBLEM_CODES

/** What is wrong with one value, before anyone knows where the value stands. */
export interface Fault {
  readonly code: ProblemCode
  /** One finished sentence, ending with what to do about it. */
  readonly message: string
  /** From the value that was looked at down to the part that is wrong; left out for the value itself. */
  readonly at?: Path
}

/**
 * Puts a problem together.
 *
 * @param code one of the closed list
 * @param path where it is, by keys and indexes
 * @param message one finished sentence that ends with what to do
 * @param range the place in the text, when it is known already
 */
export function problem(code: ProblemCode, path: Path, message: string, range?: Range): Problem {
  return range === undefined ? { code, path, message } : { code, path, message, range }
}

/**
 * Gives a fault its place.
 *
 * @param fault what is wrong with a value
 * @param path where that value stands
 */
export function faultAt(fault: Fault, path: Path): Problem {
  return problem(fault.code, fault.at === undefined ? path : [...path, ...fault.at], fault.message)
}
