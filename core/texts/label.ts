import type { Sheet, State } from '#core/glossary.ts'

const UNNAMED: ReadonlySet<string> = new Set(['installation', 'supply', 'earthing'])
const SELF_NAMED: ReadonlySet<string> = new Set(['transfer', 'load step'])

/** What a finding calls its subject: `circuit K1 (Cold store)`, `the supply`, `transfer 1`. */
export function labelOf({ subject, id, values }: Pick<Sheet, 'subject' | 'id' | 'values'>): string {
  if (UNNAMED.has(subject)) return `the ${subject}`
  if (SELF_NAMED.has(subject)) return id
  if (subject === 'person') return `${String(values['person'])} (${id})`
  if (subject === 'circuit') return `circuit ${id} (${String(values['serves'])})`
  return `${subject} ${id}`
}

/** The state in words. */
export const STATE_WORDS = { grid: 'on the grid', island: 'in the island' } as const satisfies Record<State, string>
