import type { State } from '#core/glossary.ts'

/** An answer for a name in a state. */
export type ByState<Answer> = (id: string, state: State) => Answer

/** Answers each question once: several quantities of a circuit ask for the same way and the same protection. */
export function askedOnce<Answer extends object>(answer: ByState<Answer>): ByState<Answer> {
  const known: Readonly<Record<State, Map<string, Answer>>> = { grid: new Map(), island: new Map() }
  return (id, state) => {
    const before = known[state].get(id)
    if (before) return before
    const now = answer(id, state)
    known[state].set(id, now)
    return now
  }
}
