import { INSTALL_PLAN } from '#core/generated/install-plan.ts'
import type { Problem } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { walk } from './walk.ts'

export interface Normalised {
  /** Complete only where there are no problems: a value that cannot be used is left out. */
  readonly install: Install
  readonly problems: readonly Problem[]
}

/**
 * Brings a file whose shape is right (`checkShape`) into the form that everything after works on: quantities become
 * numbers in the unit that the schema names, readings become values with their bounds, shorthand is written out, and
 * what the format supplies when it is left out is filled in. The tree itself is not changed; parts that need no work
 * are shared with it.
 *
 * @param tree the file's values, as `checkShape` accepted them
 * @returns the normalised file, and the values outside the range of their place
 */
export function normalise(tree: unknown): Normalised {
  const problems: Problem[] = []
  const install = walk(tree, INSTALL_PLAN, { path: [], problems })
  return { install: install as Install, problems }
}
