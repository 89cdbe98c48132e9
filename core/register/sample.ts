import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'

/** The name of the method, printed with each sample: another method gets another name. */
export const SAMPLE_METHOD = 'skerry-sample/1'

/** The method in words, so that somebody else can draw the same sample without Skerry. */
export const SAMPLE_WORDS =
  'For each number of the population: SHA-256 over the seed, a line feed and the number (UTF-8, no line feed at the end), in hexadecimal. Sort by it, ascending; the first ones are the sample.'

const rank = (seed: string, number: string): string => bytesToHex(sha256(utf8ToBytes(`${seed}\n${number}`)))

/**
 * Draws a sample that anybody can draw again: every subset of the size is as likely as any other, as far as SHA-256 with
 * a seed that was not chosen for its outcome is like chance.
 *
 * @param population numbers of documents, each once, in any order
 * @param seed printed with the sample
 * @param size how many; all of them when there are fewer
 * @returns numbers in the order of their hashes
 */
export function drawSample(population: readonly string[], seed: string, size: number): string[] {
  return population
    .map((number) => ({ number, by: rank(seed, number) }))
    .toSorted((a, b) => (a.by < b.by ? -1 : 1))
    .slice(0, size)
    .map(({ number }) => number)
}

/** SHA-256 in hex over the sorted numbers, each followed by a line feed: says whether two populations are the same. */
export function populationHash(population: readonly string[]): string {
  const lines = population.toSorted().map((number) => `${number}\n`)
  return bytesToHex(sha256(utf8ToBytes(lines.join(''))))
}
