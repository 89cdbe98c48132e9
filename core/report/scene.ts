import type { Judged } from '#core/engine.ts'
import type { Sheet, SheetValue, State } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { Scene } from '#core/quantities/quantity.ts'
import type { Topology } from '#core/topology/topology.ts'
import type { Issue } from './issue.ts'
import { sure } from './sure.ts'
import { Verdicts } from './verdicts.ts'

/** What a report is told beside the judged file. */
export interface ReportContext {
  /** Name of the file, without folders. */
  readonly file: string
  /** SHA-256 of its text, in hex. */
  readonly hash: string
  /** Whether the report is not issued yet. */
  readonly draft: boolean
  /** Of an issued report: what is printed beyond the file. */
  readonly issue?: Issue
}

/** Everything that the sections draw on. */
export interface ReportScene {
  readonly judged: Judged
  readonly install: Install
  readonly topology: Topology
  readonly verdicts: Verdicts
  readonly context: ReportContext
  /** For quantities that are computed for the report alone. */
  readonly quantities: Scene
  /** The sheet behind a finding or an entry of the file. */
  readonly sheet: (id: string) => Sheet
  /** The key of a judged rule's page and words. */
  readonly ruleKey: (rule: string) => string
  /** A value of a sheet, of the state where it holds in one. */
  readonly value: (id: string, name: string, state?: State) => SheetValue | undefined
  readonly number: (id: string, name: string, state?: State) => number | undefined
}

/** Opens a judged file for a report. */
export function reportScene(judged: Judged, context: ReportContext): ReportScene {
  const { install, topology, sheets, book } = judged
  const byId = new Map(sheets.map((sheet) => [sheet.id, sheet]))
  const keys = new Map(book.rules.map(({ id, key }) => [id, key]))
  const value: ReportScene['value'] = (id, name, state) => {
    const sheet = byId.get(id)
    return (state && sheet?.inState[state][name]) ?? sheet?.values[name]
  }
  return {
    judged,
    install,
    topology,
    verdicts: new Verdicts(judged),
    context,
    quantities: { install, topology, parameters: book.parameters },
    sheet: (id) => sure(byId.get(id), `The sheet of ${id}`),
    ruleKey: (rule) => sure(keys.get(rule), `The rule ${rule}`),
    value,
    number: (id, name, state) => {
      const found = value(id, name, state)
      return typeof found === 'number' ? found : undefined
    },
  }
}
