import { problem } from './errors.ts'
import type { Finding, Problem, Sheet } from './glossary.ts'
import type { Install } from './install.ts'
import { judge } from './judge/judge.ts'
import type { ShippedBook } from './judge/shipped.ts'
import { everyProblem } from './misshapen.ts'
import { normalise } from './normalise/normalise.ts'
import { type Locate, type ReadResult, read } from './read/read.ts'
import { hasShape } from './shape/shape.ts'
import { buildSheets } from './sheets/build.ts'
import { buildTopology } from './topology/build.ts'
import type { Topology } from './topology/topology.ts'

/** Finds a rule book by the name under `report.rulebook`. */
export interface Shelf {
  readonly find: (id: string) => ShippedBook | undefined
  readonly names: readonly string[]
}

/** A file that could be judged. */
export interface Judged {
  readonly kind: 'judged'
  readonly install: Install
  readonly topology: Topology
  readonly sheets: readonly Sheet[]
  readonly findings: readonly Finding[]
  readonly book: ShippedBook
  readonly locate: Locate
}

/** A file that was read, and is not in a shape to be judged. */
export interface Misshapen {
  readonly kind: 'misshapen'
  readonly problems: readonly Problem[]
  readonly locate: Locate
}

/** A file that is no YAML as the format takes it. */
export interface Unreadable {
  readonly kind: 'unreadable'
  readonly problems: readonly Problem[]
}

export type Checked = Judged | Misshapen | Unreadable

function bookFor(install: Install, shelf: Shelf): ShippedBook | Problem {
  const id = install.report.rulebook ?? 'iec'
  const book = shelf.find(id)
  return (
    book ??
    problem(
      'not-allowed-value',
      ['report', 'rulebook'],
      `There is no rule book “${id}”. At hand: ${shelf.names.join(', ')}.`,
    )
  )
}

/**
 * Reads, computes and judges an install file: all that Skerry does with a text before anything is printed.
 *
 * @param text the whole file
 * @param shelf the rule books at hand
 * @param reader `readThoroughly`, for a file that was found to be unreadable: without it only what was met first is told
 */
export function check(text: string, shelf: Shelf, reader: (text: string) => ReadResult = read): Checked {
  const file = reader(text)
  const wrongBook = (install: Install): Problem | undefined => {
    const book = bookFor(install, shelf)
    return 'code' in book ? book : undefined
  }
  if (!file.ok) {
    const { problems, certain } = file
    return {
      kind: 'unreadable',
      problems: certain ? everyProblem(certain.tree, wrongBook, { problems, certain }) : problems,
    }
  }
  const { tree, locate } = file
  const misshapen = (problems: readonly Problem[]): Misshapen => ({ kind: 'misshapen', problems, locate })
  if (!hasShape(tree)) return misshapen(everyProblem(tree, wrongBook))
  const { install, problems } = normalise(tree)
  const { topology, problems: tangles } = buildTopology(install)
  const book = bookFor(install, shelf)
  const all = 'code' in book ? [...problems, ...tangles, book] : [...problems, ...tangles]
  if (all.length > 0 || topology === undefined || 'code' in book) return misshapen(all)
  const sheets = buildSheets({ install, topology, parameters: book.parameters })
  const findings = judge(book, { sheets, tree: install, departures: install.departures ?? [] })
  return { kind: 'judged', install, topology, sheets, findings, book, locate }
}
