/** How a remark stands on a revision: where it was said, where the words have changed, or where the place is gone. */
export type Placement = 'kept' | 'changed' | 'orphaned'

/** What a remark holds on to. */
export interface Held {
  readonly anchor: string
  /** The words that stood there when it was said. */
  readonly quoted: string
}

/**
 * Carries a remark to another revision. It is judged by what was quoted, never by the revision between: a value that was
 * changed and changed back is what the remark was about, and a place that comes back is found again.
 *
 * @param quotations what stands at each place of the revision, by anchor
 */
export function carry({ anchor, quoted }: Held, quotations: ReadonlyMap<string, string>): Placement {
  const words = quotations.get(anchor)
  if (words === undefined) return 'orphaned'
  return words === quoted ? 'kept' : 'changed'
}
