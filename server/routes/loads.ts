import type { Actor } from '#core/policy/roles.ts'
import type { Tx } from '#server/db.ts'
import { findReport, lockReport, type Report } from '#server/queries/reports.ts'

interface Named {
  readonly tx: Tx
  readonly actor: Actor
  readonly params: Readonly<Record<string, string>>
}

/** The report that the path names, for reading. */
export const loadReport = ({ tx, actor, params }: Named): Promise<Report | undefined> =>
  findReport(tx, actor.organisation, params['report'] ?? '')

/** The report that the path names, locked: what changes a report goes one after the other. */
export const loadLocked = ({ tx, actor, params }: Named): Promise<Report | undefined> =>
  lockReport(tx, actor.organisation, params['report'] ?? '')

/** What the policy decides by. */
export const factsOf = ({ facts }: Report): Report['facts'] => facts

export const versionOf = ({ version }: Report): number => version
