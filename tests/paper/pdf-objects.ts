import { run, withFile } from './tools.ts'

/** A PDF dictionary as qpdf writes it in JSON: names start with `/`, text with `u:`, references end with ` R`. */
export type Dictionary = Readonly<Record<string, unknown>>

export const isDictionary = (value: unknown): value is Dictionary =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** The objects of a PDF by reference, and the way from one to the next. */
export class Objects {
  readonly #objects: Readonly<Record<string, unknown>>

  constructor(pdf: Uint8Array) {
    const printed = withFile('page.pdf', pdf, (path) => run('qpdf', '--json=2', '--json-stream-data=inline', path))
    const parsed: unknown = JSON.parse(printed)
    const parts: unknown = isDictionary(parsed) ? parsed.qpdf : undefined
    const objects: unknown = Array.isArray(parts) ? parts[1] : undefined
    if (!isDictionary(objects)) throw new Error('qpdf printed no objects')
    this.#objects = objects
  }

  /** Follows references until a value stands there; a stream gives its dictionary. */
  get(value: unknown): unknown {
    if (typeof value !== 'string' || !/^\d+ \d+ R$/.test(value)) return value
    const found = this.#objects[`obj:${value}`]
    if (!isDictionary(found)) throw new Error(`object ${value} is missing`)
    return 'stream' in found && isDictionary(found.stream) ? found.stream.dict : this.get(found.value)
  }

  /** The dictionary behind a value. */
  dictionary(value: unknown): Dictionary {
    const found = this.get(value)
    if (!isDictionary(found)) throw new Error(`no dictionary: ${JSON.stringify(value)}`)
    return found
  }

  list(value: unknown): readonly unknown[] {
    const found = this.get(value)
    return found === undefined || found === null ? [] : Array.isArray(found) ? found : [found]
  }

  /** The decoded bytes of a stream. */
  stream(value: unknown): Uint8Array {
    const found = this.#objects[`obj:${String(value)}`]
    if (!isDictionary(found) || !isDictionary(found.stream)) throw new Error(`no stream: ${String(value)}`)
    return new Uint8Array(Buffer.from(String(found.stream.data), 'base64'))
  }

  get trailer(): Dictionary {
    const found = this.#objects.trailer
    if (!isDictionary(found)) throw new Error('no trailer')
    return this.dictionary(found.value)
  }

  get catalog(): Dictionary {
    return this.dictionary(this.trailer['/Root'])
  }

  get all(): readonly unknown[] {
    return Object.values(this.#objects)
  }
}

/** An element of the structure tree. */
export interface Tag {
  readonly type: string
  readonly entries: Dictionary
  readonly children: readonly Tag[]
  /** How many stretches of page content belong to it directly. */
  readonly marked: number
}

const tagOf = (objects: Objects, value: unknown): Tag => {
  const entries = objects.dictionary(value)
  const kids = objects.list(entries['/K']).map((kid) => objects.get(kid))
  const elements = kids.filter(isDictionary).filter((kid) => '/S' in kid)
  return {
    type: String(entries['/S']),
    entries,
    children: elements.map((kid) => tagOf(objects, kid)),
    marked: kids.length - elements.length,
  }
}

/** The structure tree from its top element. */
export const structureOf = (objects: Objects): Tag => {
  const [top] = objects.list(objects.dictionary(objects.catalog['/StructTreeRoot'])['/K'])
  return tagOf(objects, top)
}

/** A tag and all tags below it. */
export const flat = (tag: Tag): readonly Tag[] => [tag, ...tag.children.flatMap(flat)]
