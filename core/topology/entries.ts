import type { Path } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import type { NodeKind } from './topology.ts'

/** Something of the file that has a name of its own. */
export interface Entry {
  readonly id: string
  /** In the trade's words, as a message calls it. */
  readonly kind: NodeKind | 'array' | 'battery' | 'meter' | 'instrument' | 'link'
  readonly path: Path
  /** The name in its `fed_from`; absent for what stands outside the tree and for the supply. */
  readonly fedFrom?: string
}

/** An entry that takes part in the tree of supply. */
export interface TreeEntry extends Entry {
  readonly kind: NodeKind
}

type Named = Readonly<Record<string, object>> | undefined
type Fed = Readonly<Record<string, { readonly fed_from: string }>> | undefined

function fed(section: string, kind: NodeKind, things: Fed): TreeEntry[] {
  return Object.entries(things ?? {}).map(([id, { fed_from }]) => ({
    id,
    kind,
    path: [section, id],
    fedFrom: fed_from,
  }))
}

function named(section: string, kind: Entry['kind'], things: Named): Entry[] {
  return Object.keys(things ?? {}).map((id) => ({ id, kind, path: [section, id] }))
}

/**
 * What takes part in the tree of supply, in the order of the format: the supply, boards, overcurrent devices, the
 * changeover, residual-current devices, inverters, circuits. All their names live in one namespace.
 */
export function treeEntries(install: Install): TreeEntry[] {
  const { id, fed_from } = install.changeover
  return [
    { id: 'supply', kind: 'supply', path: ['supply'] },
    ...fed('boards', 'board', install.boards),
    ...fed('overcurrent', 'overcurrent device', install.overcurrent),
    { id, kind: 'changeover', path: ['changeover'], fedFrom: fed_from },
    ...fed('residual_current', 'residual-current device', install.residual_current),
    ...fed('inverters', 'inverter', install.inverters),
    ...fed('circuits', 'circuit', install.circuits),
  ]
}

/** What has a name but stands outside the tree. Reports address it by that name, so it shares the namespace. */
export function otherEntries(install: Install): Entry[] {
  const { meter } = install
  return [
    ...(meter ? [{ id: meter.id, kind: 'meter', path: ['meter'] } as const] : []),
    ...named('links', 'link', install.links),
    ...named('arrays', 'array', install.arrays),
    ...named('batteries', 'battery', install.batteries),
    ...named('instruments', 'instrument', install.instruments),
  ]
}
