import { problem } from '#core/errors.ts'
import type { Path, Problem } from '#core/glossary.ts'
import type { Install } from '#core/install.ts'
import { feederId, suggestion } from './feeders.ts'

interface Reference {
  readonly path: Path
  readonly name: string
  /** Names that would do. */
  readonly known: ReadonlySet<string>
  /** What the name stands for: `an inverter`. */
  readonly means: string
}

const keys = (section: object | undefined): ReadonlySet<string> => new Set(Object.keys(section ?? {}))

function sourceReferences(install: Install): Reference[] {
  const known = keys(install.inverters)
  return (['arrays', 'batteries'] as const).flatMap((section) =>
    Object.entries(install[section] ?? {}).map(([id, { into }]) => ({
      path: [section, id, 'into'],
      name: into,
      known,
      means: 'an inverter',
    })),
  )
}

function linkReferences(install: Install, nodes: ReadonlySet<string>): Reference[] {
  return Object.entries(install.links ?? {}).flatMap(([id, link]) =>
    (['from', 'to'] as const).map((end) => ({
      path: ['links', id, end],
      name: feederId(link[end], install),
      known: nodes,
      means: 'anything in the tree of supply',
    })),
  )
}

function instrumentReferences(install: Install): Reference[] {
  const { readings } = install
  const known = keys(install.instruments)
  const named = (path: Path, name: string | undefined): Reference[] =>
    name === undefined ? [] : [{ path, name, known, means: 'an instrument' }]
  const sections = (['circuits', 'residual_current', 'arrays'] as const).flatMap((section) =>
    Object.entries(readings?.[section] ?? {}).flatMap(([id, { with: name }]) =>
      named(['readings', section, id, 'with'], name),
    ),
  )
  return [...named(['readings', 'with'], readings?.with), ...sections]
}

/** Readings stand under the name of what was tested. A circuit whose own device is residual-current protection counts as one. */
function readingReferences(install: Install): Reference[] {
  const ownProtection = Object.entries(install.circuits ?? {}).filter(([, { residual_current }]) => residual_current)
  const known = {
    circuits: { names: keys(install.circuits), means: 'a circuit' },
    residual_current: {
      names: new Set([...keys(install.residual_current), ...ownProtection.map(([id]) => id)]),
      means: 'a residual-current device',
    },
    arrays: { names: keys(install.arrays), means: 'an array' },
  } as const
  return (['circuits', 'residual_current', 'arrays'] as const).flatMap((section) =>
    [...keys(install.readings?.[section])].map((name) => ({
      path: ['readings', section, name],
      name,
      known: known[section].names,
      means: known[section].means,
    })),
  )
}

function surplusStrings(install: Install): Problem[] {
  return Object.entries(install.readings?.arrays ?? {}).flatMap(([id, { strings = [] }]) => {
    const stated = install.arrays?.[id]?.strings
    if (stated === undefined || strings.length <= stated) return []
    const count = `${stated} ${stated === 1 ? 'string' : 'strings'}`
    const message = `Array \`${id}\` has ${count}, but readings of ${strings.length} are given. Take the surplus out, or mend \`strings\` of the array.`
    return [problem('too-many', ['readings', 'arrays', id, 'strings', stated], message)]
  })
}

/**
 * References outside the tree of supply that lead nowhere: `into` of arrays and batteries, `with` of readings, the names
 * under which readings stand, the ends of links (all `dangling-name`), and more string readings than an array has
 * strings (`too-many`).
 *
 * @param nodes ids of everything in the tree of supply
 */
export function referenceProblems(install: Install, nodes: ReadonlySet<string>): Problem[] {
  const references = [
    ...sourceReferences(install),
    ...linkReferences(install, nodes),
    ...instrumentReferences(install),
    ...readingReferences(install),
  ]
  const dangling = references
    .filter(({ name, known }) => !known.has(name))
    .map(({ path, name, known, means }) =>
      problem(
        'dangling-name',
        path,
        `\`${name}\` does not name ${means} of this file. ${suggestion(name, [...known])}`,
      ),
    )
  return [...dangling, ...surplusStrings(install)]
}
