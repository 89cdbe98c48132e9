/** The keywords of JSON Schema that the install file's schema uses, as TypeScript sees them. */
export interface SchemaNode {
  readonly $schema?: string
  readonly $id?: string
  readonly $ref?: string
  readonly $defs?: Readonly<Record<string, SchemaNode>>
  readonly title?: string
  readonly description?: string
  readonly examples?: readonly unknown[]
  readonly default?: string | number
  readonly type?: string | readonly string[]
  readonly enum?: readonly (string | number)[]
  readonly const?: number
  readonly pattern?: string
  readonly minLength?: number
  readonly maxLength?: number
  readonly minimum?: number
  readonly exclusiveMinimum?: number
  readonly maximum?: number
  readonly minItems?: number
  readonly maxItems?: number
  readonly uniqueItems?: boolean
  readonly items?: SchemaNode
  readonly properties?: Readonly<Record<string, SchemaNode | false>>
  readonly required?: readonly string[]
  readonly additionalProperties?: SchemaNode | false
  readonly propertyNames?: SchemaNode
  readonly maxProperties?: number
  readonly not?: SchemaNode
  readonly if?: SchemaNode
  readonly then?: SchemaNode
  readonly else?: SchemaNode
  /** Kind of quantity: text at this place carries a unit of that kind. */
  readonly 'x-quantity'?: string
  /** Kind of quantity of a reading. */
  readonly 'x-reading'?: string
  /** The unit of a bare number at this place, and of the normalised value. */
  readonly 'x-unit'?: string
  readonly 'x-shorthand'?: 'device' | 'cable'
  readonly 'x-date'?: 'day' | 'moment'
  /** What the name at this place names. */
  readonly 'x-name-of'?: string
  /** Meanings of the allowed values, in their order. */
  readonly 'x-meanings'?: readonly string[]
}

/** Annotations of our own, which a strict validator must be told about. */
export const ANNOTATIONS = [
  'x-quantity',
  'x-reading',
  'x-unit',
  'x-shorthand',
  'x-date',
  'x-name-of',
  'x-meanings',
] as const
