import { CHUNK, type UploadProblem } from './upload.ts'

type Words = {
  readonly [Code in UploadProblem['code']]: (problem: Extract<UploadProblem, { code: Code }>) => string
}

const megabytes = (bytes: number): string => `${(bytes / 1e6).toFixed(1)} MB`

const WORDS: Words = {
  empty: () => 'The file is empty. Choose it again.',
  'too-large': ({ limit }) =>
    `The file is larger than the ${megabytes(limit)} that are taken. Send a smaller version of it.`,
  'bad-hash': () => 'The declared SHA-256 must be 64 small hexadecimal digits.',
  unknown: () => 'There is no such upload. Begin it again; parts that were sent are not kept for ever.',
  expired: () => 'The upload was not finished in time. Begin it again.',
  'bad-offset': ({ offset }) =>
    `No part begins at byte ${offset}. Parts begin at multiples of ${CHUNK} and below the declared size.`,
  'bad-length': ({ expected, found }) =>
    `The part has ${found} bytes instead of ${expected}. It was cut off on its way; send it again.`,
  incomplete: ({ missing }) =>
    `${missing.length === 1 ? 'One part has' : `${missing.length} parts have`} not come yet. Send what is missing, then finish again.`,
  'other-content': () =>
    'The parts do not make the file that was declared: it changed while it was sent, or was damaged on its way. Send all parts again.',
}

/** A sentence for who sends a file: what is wrong, what is expected, what to do. */
export function uploadWords(problem: UploadProblem): string {
  const words = WORDS[problem.code] as (problem: UploadProblem) => string
  return words(problem)
}
